import type { Region, Ring } from '@/lib/geometry/contour';
import { offsetRegion } from '@/lib/geometry/offset';
import { regionContains } from '@/lib/geometry/measure';
import { cross, subtract, type Vec } from '@/lib/geometry/vec';

/** The allowed ground is widened by this before a link is tested, so that links may end on its very edge, mm. */
const EDGE_SLACK = 0.004;

/** Tells whether the cutter's axis may run straight between two places without leaving the allowed ground. */
export type LinkTest = (from: Vec, to: Vec) => boolean;

/** A test for straight links that stay within `ground`, the places where the cutter's axis may be. */
export function createLinkTest(ground: Region): LinkTest {
  const wide = offsetRegion(ground, EDGE_SLACK);
  const boxes = wide.map(ringBox);
  return (from, to) =>
    regionContains(wide, from) &&
    !wide.some((ring, i) => touchesBox(boxes[i]!, from, to) && crossesRing(ring, from, to));
}

interface RingBox {
  minX: number;
  maxX: number;
  minY: number;
  maxY: number;
}

function ringBox(ring: Ring): RingBox {
  const box = { minX: Infinity, maxX: -Infinity, minY: Infinity, maxY: -Infinity };
  for (const { x, y } of ring) {
    box.minX = Math.min(box.minX, x);
    box.maxX = Math.max(box.maxX, x);
    box.minY = Math.min(box.minY, y);
    box.maxY = Math.max(box.maxY, y);
  }
  return box;
}

function touchesBox(box: RingBox, a: Vec, b: Vec): boolean {
  return (
    Math.max(a.x, b.x) >= box.minX &&
    Math.min(a.x, b.x) <= box.maxX &&
    Math.max(a.y, b.y) >= box.minY &&
    Math.min(a.y, b.y) <= box.maxY
  );
}

function crossesRing(ring: Ring, a: Vec, b: Vec): boolean {
  const ab = subtract(b, a);
  for (let i = 0; i < ring.length; i++) {
    const c = ring[i]!;
    const d = ring[(i + 1) % ring.length]!;
    if (Math.max(c.x, d.x) < Math.min(a.x, b.x) || Math.min(c.x, d.x) > Math.max(a.x, b.x)) continue;
    const cd = subtract(d, c);
    const sideC = cross(ab, subtract(c, a));
    const sideD = cross(ab, subtract(d, a));
    const sideA = cross(cd, subtract(a, c));
    const sideB = cross(cd, subtract(b, c));
    if (sideC * sideD <= 0 && sideA * sideB <= 0 && sideC !== sideD) return true;
  }
  return false;
}
