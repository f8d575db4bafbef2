import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { demoCutters } from '@/lib/job/examples/demo-shop';
import { type Cutter, cutter } from '@/lib/job/machine-schema';
import { ShopCutter } from '@/entities/shop-cutter.entity';

/**
 * Common router cutters with cautious speeds for hardwood, so that a new shop is not empty. Speeds are estimates from
 * common practice: a chip of 0.03 to 0.06 mm a tooth, a layer of half the diameter.
 */
export const STARTER_CUTTERS: readonly Cutter[] = [
  ...Object.values(demoCutters).map((input) => cutter.parse(input)),
  {
    id: 'v90',
    number: 4,
    name: '90 degree V-bit',
    kind: 'vbit',
    angle: 90,
    tip: 0,
    diameter: 12,
    flutes: 2,
    fluteLength: 6,
    reach: 25,
    shank: 6,
    centreCutting: true,
    speeds: { rpm: 18000, feed: 1200, plunge: 400, stepdown: 2, stepover: 0.1 },
  },
  {
    id: 'flat12',
    number: 5,
    name: '12 mm two-flute upcut',
    kind: 'flat',
    diameter: 12,
    flutes: 2,
    fluteLength: 35,
    reach: 45,
    shank: 12,
    centreCutting: true,
    speeds: { rpm: 16000, feed: 2200, plunge: 600, stepdown: 5, stepover: 0.45 },
  },
  {
    id: 'ball6',
    number: 6,
    name: '6 mm ball nose',
    kind: 'ball',
    diameter: 6,
    flutes: 2,
    fluteLength: 22,
    reach: 35,
    shank: 6,
    centreCutting: true,
    speeds: { rpm: 18000, feed: 1600, plunge: 500, stepdown: 2, stepover: 0.15 },
  },
  {
    id: 'drill5',
    number: 7,
    name: '5 mm brad-point drill',
    kind: 'drill',
    angle: 118,
    diameter: 5,
    flutes: 2,
    fluteLength: 40,
    reach: 50,
    shank: 5,
    centreCutting: true,
    speeds: { rpm: 8000, feed: 400, plunge: 400, stepdown: 5, stepover: 0.5 },
  },
];

/** Puts {@link STARTER_CUTTERS} on a shop's list, which must not hold these numbers yet. */
export async function addStarterCutters(em: EntityManager, shopId: string): Promise<void> {
  await em.insertMany(
    ShopCutter,
    STARTER_CUTTERS.map((one) => ({ id: randomUUID(), shop: shopId, number: one.number, cutter: one })),
  );
}
