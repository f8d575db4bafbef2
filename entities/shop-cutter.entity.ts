import { defineEntity, type InferEntity, p } from '@mikro-orm/core';
import type { Cutter } from '@/lib/job/machine-schema';
import { Shop } from './shop.entity';

/** A cutter of a shop's list, as a job document takes it over. */
export const ShopCutter = defineEntity({
  name: 'ShopCutter',
  tableName: 'shop_cutters',
  uniques: [{ name: 'shop_cutters_number_unique', properties: ['shop', 'number'] }],
  properties: {
    id: p.uuid().primary(),
    shop: () => p.manyToOne(Shop).ref().deleteRule('cascade'),
    /** The cutter's own number, for order and uniqueness. */
    number: p.integer(),
    cutter: p.json<Cutter>(),
  },
});
export type ShopCutter = InferEntity<typeof ShopCutter>;
