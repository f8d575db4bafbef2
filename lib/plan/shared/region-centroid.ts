import type { Region } from '@/lib/geometry/contour';
import type { Vec } from '@/lib/geometry/vec';

/** The centroid of a region's area, holes taken off (sum over triangles from the first point, signed). */
export function regionCentroid(region: Region): Vec {
  const origin = region[0]?.[0];
  if (!origin) throw new Error('An empty region has no centroid');
  let twice = 0;
  let x = 0;
  let y = 0;
  for (const ring of region) {
    ring.forEach((p, i) => {
      const q = ring[(i + 1) % ring.length]!;
      const [px, py, qx, qy] = [p.x - origin.x, p.y - origin.y, q.x - origin.x, q.y - origin.y];
      const area = px * qy - py * qx;
      twice += area;
      x += (px + qx) * area;
      y += (py + qy) * area;
    });
  }
  return { x: origin.x + x / (3 * twice), y: origin.y + y / (3 * twice) };
}
