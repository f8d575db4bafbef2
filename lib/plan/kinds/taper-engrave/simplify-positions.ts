import type { Position } from '@/lib/moves/move';

/** A path in space with fewer points, none left out farther than `tolerance` from it (Douglas–Peucker). Ends stay. */
export function simplifyPositions(points: readonly Position[], tolerance: number): Position[] {
  if (points.length < 3) return [...points];
  const keep = new Uint8Array(points.length);
  keep[0] = 1;
  keep[points.length - 1] = 1;
  const stack: [number, number][] = [[0, points.length - 1]];
  for (let range = stack.pop(); range; range = stack.pop()) {
    const [first, last] = range;
    let far = tolerance;
    let index = -1;
    for (let i = first + 1; i < last; i++) {
      const away = distanceToSegment(points[i]!, points[first]!, points[last]!);
      if (away > far) {
        far = away;
        index = i;
      }
    }
    if (index >= 0) {
      keep[index] = 1;
      stack.push([first, index], [index, last]);
    }
  }
  return points.filter((_, i) => keep[i] === 1);
}

function distanceToSegment(p: Position, a: Position, b: Position): number {
  const [x, y, z] = [b.x - a.x, b.y - a.y, b.z - a.z];
  const size = x * x + y * y + z * z;
  const t =
    size > 0 ? Math.min(1, Math.max(0, ((p.x - a.x) * x + (p.y - a.y) * y + (p.z - a.z) * z) / size)) : 0;
  return Math.hypot(p.x - a.x - x * t, p.y - a.y - y * t, p.z - a.z - z * t);
}
