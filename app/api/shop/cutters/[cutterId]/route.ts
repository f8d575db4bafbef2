import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { changeShopCutter, deleteShopCutter } from '@/lib/server/shop/shop-cutters';

export const PUT = route(ENDPOINTS.changeShopCutter, ({ em, principal, params, body }) =>
  changeShopCutter(em, principal, params.cutterId, body.cutter),
);
export const DELETE = route(ENDPOINTS.deleteShopCutter, ({ em, principal, params }) =>
  deleteShopCutter(em, principal, params.cutterId),
);
