import { edgeRise, type CutterShape } from '@/lib/proof/cutter-shape';
import type { MotionPoint } from '@/lib/proof/motion';

/**
 * Lowest height of a cutter's edge over a place along a chain of points, by trying ever finer positions: slow, and by
 * another way than the sweep. The edge's height along a straight motion is convex in the position, so a ternary search
 * over the stretch where the cutter covers the place finds its least.
 */
export function lowestEdge(shape: CutterShape, chain: readonly MotionPoint[], x: number, y: number): number {
  let lowest = 0;
  for (let i = 1; i < chain.length; i++)
    lowest = Math.min(lowest, along(shape, chain[i - 1]!, chain[i]!, x, y));
  return lowest;
}

function along(shape: CutterShape, a: MotionPoint, b: MotionPoint, x: number, y: number): number {
  const at = (t: number) => ({
    x: a.x + (b.x - a.x) * t,
    y: a.y + (b.y - a.y) * t,
    z: a.z + (b.z - a.z) * t,
  });
  const away = (t: number) => Math.hypot(at(t).x - x, at(t).y - y);
  const height = (t: number) => at(t).z + edgeRise(shape, Math.min(away(t), shape.radius));
  const square = (b.x - a.x) ** 2 + (b.y - a.y) ** 2;
  const foot = square > 0 ? ((x - a.x) * (b.x - a.x) + (y - a.y) * (b.y - a.y)) / square : 0;
  const nearest = Math.min(1, Math.max(0, foot));
  if (away(nearest) > shape.radius) return Infinity;
  const first = away(0) <= shape.radius ? 0 : edge((t) => away(t) > shape.radius, 0, nearest);
  const last = away(1) <= shape.radius ? 1 : edge((t) => away(t) > shape.radius, 1, nearest);
  return height(search(height, first, last));
}

function search(value: (t: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  for (let i = 0; i < 44; i++) {
    const a = low + (high - low) / 3;
    const b = high - (high - low) / 3;
    if (value(a) <= value(b)) high = b;
    else low = a;
  }
  return [from, to, (low + high) / 2].reduce((best, t) => (value(t) < value(best) ? t : best));
}

/** Where `outside` turns false between a place outside and one inside; on the inside. */
function edge(outside: (t: number) => boolean, out: number, within: number): number {
  let [o, i] = [out, within];
  for (let n = 0; n < 44; n++) {
    const middle = (o + i) / 2;
    if (outside(middle)) o = middle;
    else i = middle;
  }
  return i;
}
