import { defineEntity, type InferEntity, p } from '@mikro-orm/core';

export const Shop = defineEntity({
  name: 'Shop',
  tableName: 'shops',
  properties: {
    id: p.uuid().primary(),
    name: p.string().length(80),
    createdAt: p.datetime(3),
  },
});
export type Shop = InferEntity<typeof Shop>;
