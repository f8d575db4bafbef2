import type { Region } from '@/lib/geometry/contour';
import { DEGREES, rotate, type Vec } from '@/lib/geometry/vec';

/** A straight pass. */
export interface RasterLine {
  readonly from: Vec;
  readonly to: Vec;
}

/**
 * Parallel passes at `angle` degrees over a region, at most `spacing` apart, the outermost on its edges (n = ⌈W / s⌉ + 1
 * lines, evenly spaced). Each row holds the stretches of its line that lie in the region, in order; rows go up across
 * the angle.
 */
export function rasterRows(region: Region, angle: number, spacing: number): RasterLine[][] {
  const turned = region.map((ring) => ring.map((p) => rotate(p, -angle * DEGREES)));
  const ys = turned.flatMap((ring) => ring.map(({ y }) => y));
  if (ys.length === 0) return [];
  const low = Math.min(...ys);
  const high = Math.max(...ys);
  const count = Math.ceil((high - low) / spacing - 1e-9) + 1;
  const rows: RasterLine[][] = [];
  for (let i = 0; i < count; i++) {
    const y = count === 1 ? low : low + ((high - low) * i) / (count - 1);
    // On the very edge a scan line meets only corners; a hair inside it meets the edge's whole length.
    const inside = Math.min(Math.max(y, low + 1e-5), high - 1e-5);
    const back = (x: number) => rotate({ x, y: inside }, angle * DEGREES);
    const xs = crossings(turned, inside);
    const row: RasterLine[] = [];
    for (let k = 0; k + 1 < xs.length; k += 2) row.push({ from: back(xs[k]!), to: back(xs[k + 1]!) });
    if (row.length > 0) rows.push(row);
  }
  return rows;
}

/** Rows one after another, every second one backwards. */
export function toAndFro(rows: readonly (readonly RasterLine[])[]): RasterLine[] {
  return rows.flatMap((row, i) =>
    i % 2 === 0 ? row : [...row].reverse().map(({ from, to }) => ({ from: to, to: from })),
  );
}

function crossings(rings: readonly (readonly Vec[])[], y: number): number[] {
  const xs: number[] = [];
  for (const ring of rings) {
    for (let i = 0; i < ring.length; i++) {
      const a = ring[i]!;
      const b = ring[(i + 1) % ring.length]!;
      if (a.y > y !== b.y > y) xs.push(a.x + ((b.x - a.x) * (y - a.y)) / (b.y - a.y));
    }
  }
  return xs.sort((p, q) => p - q);
}
