import { defineEntity, type InferEntity, p } from '@mikro-orm/core';
import { SHOP_ROLES } from '@/lib/contracts/roles';
import { Shop } from './shop.entity';
import { User } from './user.entity';

/** Somebody's role in a shop. */
export const Membership = defineEntity({
  name: 'Membership',
  tableName: 'memberships',
  indexes: [{ name: 'memberships_user_index', properties: ['user'] }],
  properties: {
    shop: () => p.manyToOne(Shop).primary().ref().deleteRule('cascade'),
    user: () => p.manyToOne(User).primary().ref().deleteRule('cascade'),
    role: p.enum([...SHOP_ROLES]),
    addedAt: p.datetime(3),
  },
});
export type Membership = InferEntity<typeof Membership>;
