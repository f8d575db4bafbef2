import { z } from 'zod';
import { cutter } from '@/lib/job/machine-schema';
import { recordId } from './moment';

/** A cutter of a shop's list. `cutter` is what a job document takes over as it stands. */
export const shopCutter = z.object({
  id: recordId,
  shop: z.object({ id: recordId, name: z.string() }),
  cutter,
  /** Whether the asking person may change the list it is in. */
  editable: z.boolean(),
});
export type ShopCutter = z.infer<typeof shopCutter>;

/** Cutters of every shop the asking person is in, by shop and number. */
export const shopCutters = z.object({ items: z.array(shopCutter) });
export type ShopCutters = z.infer<typeof shopCutters>;

export const createShopCutterBody = z.strictObject({ shop: recordId, cutter });
export type CreateShopCutterBody = z.input<typeof createShopCutterBody>;

export const changeShopCutterBody = z.strictObject({ cutter });
export type ChangeShopCutterBody = z.input<typeof changeShopCutterBody>;
