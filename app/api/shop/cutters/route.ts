import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { createShopCutter, listShopCutters } from '@/lib/server/shop/shop-cutters';

export const GET = route(ENDPOINTS.listShopCutters, ({ em, principal }) => listShopCutters(em, principal));
export const POST = route(ENDPOINTS.createShopCutter, ({ em, principal, body }) =>
  createShopCutter(em, principal, body.shop, body.cutter),
);
