import type { Box, Region, Ring } from './contour';
import { distance, type Vec } from './vec';

/** Signed area of a ring, mm²: positive counter-clockwise. Measured from its first point, so that far rings stay exact. */
export function ringArea(ring: Ring): number {
  const origin = ring[0];
  if (!origin) return 0;
  let twice = 0;
  for (let i = 0; i < ring.length; i++) {
    const a = ring[i]!;
    const b = ring[(i + 1) % ring.length]!;
    twice += (a.x - origin.x) * (b.y - origin.y) - (b.x - origin.x) * (a.y - origin.y);
  }
  return twice / 2;
}

/** Area of a region, mm²: holes count negative by their sense. */
export function regionArea(region: Region): number {
  return region.reduce((sum, ring) => sum + ringArea(ring), 0);
}

/** Length round a ring, mm. */
export function ringLength(ring: Ring): number {
  return ring.reduce((sum, point, i) => sum + distance(point, ring[(i + 1) % ring.length]!), 0);
}

/** The box round points; of none it is empty (min above max). */
export function pointsBox(points: Iterable<Vec>): Box {
  let minX = Number.POSITIVE_INFINITY;
  let minY = Number.POSITIVE_INFINITY;
  let maxX = Number.NEGATIVE_INFINITY;
  let maxY = Number.NEGATIVE_INFINITY;
  for (const { x, y } of points) {
    if (x < minX) minX = x;
    if (x > maxX) maxX = x;
    if (y < minY) minY = y;
    if (y > maxY) maxY = y;
  }
  return { minX, minY, maxX, maxY };
}

export function regionBox(region: Region): Box {
  return pointsBox(region.flat());
}

/** How often a ring runs counter-clockwise round a point not on it. */
export function windingNumber(ring: Ring, { x, y }: Vec): number {
  let winding = 0;
  for (let i = 0; i < ring.length; i++) {
    const a = ring[i]!;
    const b = ring[(i + 1) % ring.length]!;
    const up = a.y <= y && b.y > y;
    const down = a.y > y && b.y <= y;
    if (!up && !down) continue;
    const side = (b.x - a.x) * (y - a.y) - (x - a.x) * (b.y - a.y);
    if (up && side > 0) winding++;
    if (down && side < 0) winding--;
  }
  return winding;
}

/** Whether a point lies within a ring, whatever its sense; on the ring itself either answer may come. */
export function ringContains(ring: Ring, point: Vec): boolean {
  return windingNumber(ring, point) !== 0;
}

/** Whether a point lies in a region (filled non-zero); on its edge either answer may come. */
export function regionContains(region: Region, point: Vec): boolean {
  let winding = 0;
  for (const ring of region) winding += windingNumber(ring, point);
  return winding !== 0;
}

/** Centroid of the area of a region; of one without area, the middle of its box. */
export function regionCentroid(region: Region): Vec {
  let twice = 0;
  let mx = 0;
  let my = 0;
  const origin = region[0]?.[0] ?? { x: 0, y: 0 };
  for (const ring of region) {
    for (let i = 0; i < ring.length; i++) {
      const a = ring[i]!;
      const b = ring[(i + 1) % ring.length]!;
      const ax = a.x - origin.x;
      const ay = a.y - origin.y;
      const bx = b.x - origin.x;
      const by = b.y - origin.y;
      const part = ax * by - bx * ay;
      twice += part;
      mx += (ax + bx) * part;
      my += (ay + by) * part;
    }
  }
  if (Math.abs(twice) < 1e-12) {
    const { minX, minY, maxX, maxY } = regionBox(region);
    return { x: (minX + maxX) / 2, y: (minY + maxY) / 2 };
  }
  return { x: origin.x + mx / (3 * twice), y: origin.y + my / (3 * twice) };
}
