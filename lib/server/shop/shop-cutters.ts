import 'server-only';
import { randomUUID } from 'node:crypto';
import { type EntityManager, UniqueConstraintViolationException } from '@mikro-orm/postgresql';
import { mayInShop } from '@/lib/contracts/roles';
import type { ShopCutter as ShopCutterAnswer, ShopCutters } from '@/lib/contracts/shop';
import type { Cutter } from '@/lib/job/machine-schema';
import { Membership } from '@/entities/membership.entity';
import { ShopCutter } from '@/entities/shop-cutter.entity';
import { requireShop } from '../access/shop-access';
import type { Principal } from '../auth/principal';
import { ApiError, notFound } from '../http/api-error';

/** Cutters of every shop that `principal` is in. */
export async function listShopCutters(em: EntityManager, { userId }: Principal): Promise<ShopCutters> {
  const memberships = await em.find(Membership, { user: userId });
  const roles = new Map(memberships.map(({ shop, role }) => [shop.id, role]));
  const cutters = await em.find(
    ShopCutter,
    { shop: { $in: [...roles.keys()] } },
    { populate: ['shop'], orderBy: { shop: { name: 'asc', id: 'asc' }, number: 'asc' } },
  );
  const items = cutters.map((row) =>
    cutterAnswer(row, mayInShop(roles.get(row.shop.id) ?? null, 'shop.manage-cutters')),
  );
  return { items };
}

/** Adds a cutter to the list of `shopId`, as its steward. */
export async function createShopCutter(
  em: EntityManager,
  principal: Principal,
  shopId: string,
  cutter: Cutter,
): Promise<ShopCutterAnswer> {
  await requireShop(em, principal, shopId, 'shop.manage-cutters');
  const id = randomUUID();
  await numberedOnce(cutter, () =>
    em.insert(ShopCutter, { id, shop: shopId, number: cutter.number, cutter }),
  );
  return cutterAnswer(await findCutter(em, id), true);
}

export async function changeShopCutter(
  em: EntityManager,
  principal: Principal,
  id: string,
  cutter: Cutter,
): Promise<ShopCutterAnswer> {
  await requireCutter(em, principal, id);
  await numberedOnce(cutter, () => em.nativeUpdate(ShopCutter, { id }, { number: cutter.number, cutter }));
  return cutterAnswer(await findCutter(em, id), true);
}

export async function deleteShopCutter(em: EntityManager, principal: Principal, id: string): Promise<void> {
  await requireCutter(em, principal, id);
  await em.nativeDelete(ShopCutter, { id });
}

/** The cutter is as much there as its shop is. */
async function requireCutter(em: EntityManager, principal: Principal, id: string): Promise<void> {
  const row = await findCutter(em, id);
  await requireShop(em, principal, row.shop.id, 'shop.manage-cutters');
}

async function findCutter(em: EntityManager, id: string): Promise<ShopCutter> {
  const row = await em.fork().findOne(ShopCutter, { id }, { populate: ['shop'] });
  if (!row) throw notFound('The shop');
  return row;
}

async function numberedOnce(cutter: Cutter, write: () => Promise<unknown>): Promise<void> {
  try {
    await write();
  } catch (error) {
    if (!(error instanceof UniqueConstraintViolationException)) throw error;
    throw new ApiError('conflict', `Number ${cutter.number} is taken in this shop.`);
  }
}

function cutterAnswer(row: ShopCutter, editable: boolean): ShopCutterAnswer {
  return {
    id: row.id,
    shop: { id: row.shop.getEntity().id, name: row.shop.getEntity().name },
    cutter: row.cutter,
    editable,
  };
}
