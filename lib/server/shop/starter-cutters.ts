import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { Cutter } from '@/lib/job/machine-schema';
import { ShopCutter } from '@/entities/shop-cutter.entity';

/**
 * A small set of common router cutters with cautious speeds for hardwood, so that a new shop is not empty. Speeds are
 * estimates from common practice: a chip of 0.03 to 0.06 mm a tooth, a layer of half the diameter.
 */
export const STARTER_CUTTERS: readonly Cutter[] = [
  flat('flat6', 1, '6 mm two-flute upcut', 6, 25, { feed: 1800, plunge: 500, stepdown: 3 }),
  flat('flat3', 2, '3 mm two-flute upcut', 3, 12, { feed: 1200, plunge: 400, stepdown: 1.5 }),
  flat('flat12', 3, '12 mm two-flute upcut', 12, 35, { feed: 2200, plunge: 600, stepdown: 5 }),
  vbit('v60', 4, '60 degree V-bit', 6, 60),
  vbit('v90', 5, '90 degree V-bit', 12, 90),
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
    STARTER_CUTTERS.map((cutter) => ({ id: randomUUID(), shop: shopId, number: cutter.number, cutter })),
  );
}

function flat(
  id: string,
  number: number,
  name: string,
  diameter: number,
  fluteLength: number,
  speeds: { feed: number; plunge: number; stepdown: number },
): Cutter {
  return {
    id,
    number,
    name,
    kind: 'flat',
    diameter,
    flutes: 2,
    fluteLength,
    reach: fluteLength + 10,
    shank: Math.max(6, diameter),
    centreCutting: true,
    speeds: { rpm: 18000, stepover: 0.45, ...speeds },
  };
}

function vbit(id: string, number: number, name: string, diameter: number, angle: number): Cutter {
  return {
    id,
    number,
    name,
    kind: 'vbit',
    angle,
    tip: 0,
    diameter,
    flutes: 2,
    fluteLength: Number((diameter / 2 / Math.tan((angle * Math.PI) / 360)).toFixed(1)),
    reach: 30,
    shank: 6,
    centreCutting: true,
    speeds: { rpm: 18000, feed: 1200, plunge: 400, stepdown: 2, stepover: 0.1 },
  };
}
