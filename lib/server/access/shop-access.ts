import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { mayInShop, type ShopPermission } from '@/lib/contracts/roles';
import { Membership } from '@/entities/membership.entity';
import type { Principal } from '../auth/principal';
import { ApiError, notFound } from '../http/api-error';

declare const proof: unique symbol;

/** Proof that somebody may do something in a shop; only {@link requireShop} makes it. */
export interface ShopAccess {
  readonly shopId: string;
  readonly [proof]: true;
}

/** Lets `principal` into the shop if their role has `permission`; to those outside the shop is not there. */
export async function requireShop(
  em: EntityManager,
  principal: Principal,
  shopId: string,
  permission: ShopPermission,
): Promise<ShopAccess> {
  const member = await em.findOne(Membership, { shop: shopId, user: principal.userId });
  if (!member) throw notFound('The shop');
  if (!mayInShop(member.role, permission)) {
    throw new ApiError('forbidden', `As ${member.role} of this shop you cannot do that; ask its steward.`);
  }
  return { shopId } as ShopAccess;
}
