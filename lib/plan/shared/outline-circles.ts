import type { Contour } from '@/lib/geometry/contour';
import { flattenContour } from '@/lib/geometry/flatten';
import { regionCentroid } from '@/lib/geometry/measure';
import { distance, type Vec } from '@/lib/geometry/vec';
import type { ResolvedOutline } from '@/lib/outline/resolve-outlines';

/** A drawn curve may stray this far from a true circle and still be meant as one, mm (circles drawn as four cubics do). */
const ROUNDNESS = 0.03;

export interface Circle {
  readonly center: Vec;
  readonly radius: number;
}

/** The circles that an outline draws, or null where one of its contours is not a circle. */
export function circlesOf(outline: ResolvedOutline): Circle[] | null {
  const circles = outline.contours.map(circleOf);
  return circles.every((circle) => circle !== null) ? circles : null;
}

function circleOf(contour: Contour): Circle | null {
  if (!contour.closed) return null;
  const first = contour.segments[0];
  if (first?.kind === 'arc') {
    const { center } = first;
    const radius = distance(contour.start, center);
    const isWhole = contour.segments.every(
      (segment) => segment.kind === 'arc' && distance(segment.center, center) < 1e-6,
    );
    if (isWhole) return { center, radius };
  }
  const { points } = flattenContour(contour, 0.001);
  if (points.length < 12) return null;
  const center = regionCentroid([points]);
  const radii = points.map((p) => distance(p, center));
  const [least, most] = [Math.min(...radii), Math.max(...radii)];
  return most - least <= 2 * ROUNDNESS ? { center, radius: (least + most) / 2 } : null;
}
