import type { Contour, Region, Segment } from '@/lib/geometry/contour';
import type { Vec } from '@/lib/geometry/vec';
import type { Job } from '@/lib/job/job-schema';
import { turnPoint } from '@/lib/job/turn';

/** Carries what is seen in one face's view to the other's. */
export interface Turner {
  readonly point: (point: Vec) => Vec;
  /** Start and order stay; the sense is reversed, as a mirror does. */
  readonly contour: (contour: Contour) => Contour;
  /** Rings run the other way round afterwards, so that outer rings stay counter-clockwise. */
  readonly region: (region: Region) => Region;
}

/** The turn of this job's board, there and back alike. */
export function boardTurner({ board, turn }: Pick<Job, 'board' | 'turn'>): Turner {
  const point = (p: Vec): Vec => turnPoint(board, turn.axis, p);
  return {
    point,
    contour: ({ start, segments, closed }) => ({
      start: point(start),
      segments: segments.map((segment) => turnSegment(segment, point)),
      closed,
    }),
    region: (region) => region.map((ring) => ring.map(point).reverse()),
  };
}

function turnSegment(segment: Segment, point: (p: Vec) => Vec): Segment {
  const to = point(segment.to);
  switch (segment.kind) {
    case 'line':
      return { kind: 'line', to };
    case 'arc':
      return { kind: 'arc', to, center: point(segment.center), ccw: !segment.ccw };
    case 'cubic':
      return { kind: 'cubic', control1: point(segment.control1), control2: point(segment.control2), to };
  }
}
