import type { Box, Contour, Polyline } from '@/lib/geometry/contour';
import { flattenContour } from '@/lib/geometry/flatten';
import { pointsBox } from '@/lib/geometry/measure';
import type { Vec } from '@/lib/geometry/vec';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import type { Shape } from '@/lib/job/shape-schema';
import type { FontBook } from '@/lib/outline/fonts';
import { shapeContours } from '@/lib/outline/shape-contours';
import { boardTurner, type Turner } from '@/lib/outline/turn-contours';

/** An outline as the plan draws it, in the view of the face that is up, mm. */
export interface SceneOutline {
  readonly id: string;
  readonly name: string;
  /** The face it was drawn on; the far face's are hidden lines. */
  readonly drawnOn: Face;
  readonly contours: readonly Contour[];
  readonly lines: readonly Polyline[];
  readonly points: readonly Vec[];
  readonly box: Box;
  readonly fillRule: 'nonzero' | 'evenodd';
}

export interface Scene {
  readonly face: Face;
  readonly outlines: readonly SceneOutline[];
}

/** Chords lie this near to the curve, mm: beneath a pixel at the zoom at which people draw. */
const SEEN_TOLERANCE = 0.02;

interface Drawn {
  readonly contours: readonly Contour[];
  readonly lines: readonly Polyline[];
  readonly points: readonly Vec[];
  readonly fillRule: 'nonzero' | 'evenodd';
}

const EMPTY: Drawn = { contours: [], lines: [], points: [], fillRule: 'nonzero' };

export type SceneMaker = (job: Job, face: Face) => Scene;

/**
 * Makes scenes and remembers each shape's lines, so that moving one outline draws one outline anew. What cannot be
 * drawn (broken path data) is simply not there; the planner says why.
 */
export function createSceneMaker(fonts: FontBook): SceneMaker {
  const own = new WeakMap<Shape, Drawn>();
  const turned = new WeakMap<Drawn, { key: string; drawn: Drawn }>();

  const drawnOf = (shape: Shape): Drawn => {
    const known = own.get(shape);
    if (known) return known;
    const drawn = drawShape(shape, fonts);
    own.set(shape, drawn);
    return drawn;
  };
  const turnedOf = (drawn: Drawn, job: Job, turner: Turner): Drawn => {
    const key = `${job.turn.axis} ${job.board.x} ${job.board.y}`;
    const known = turned.get(drawn);
    if (known?.key === key) return known.drawn;
    const over = turnDrawn(drawn, turner);
    turned.set(drawn, { key, drawn: over });
    return over;
  };

  return (job, face) => {
    const turner = boardTurner(job);
    const outlines = job.outlines.flatMap(({ id, name, face: drawnOn, shape }): SceneOutline[] => {
      const drawn = drawnOf(shape);
      const seen = drawnOn === face ? drawn : turnedOf(drawn, job, turner);
      const all = [...seen.lines.flatMap(({ points }) => points), ...seen.points];
      if (all.length === 0) return [];
      return [{ ...seen, id, name: name === '' ? id : name, drawnOn, box: pointsBox(all) }];
    });
    return { face, outlines };
  };
}

function drawShape(shape: Shape, fonts: FontBook): Drawn {
  const result = shapeContours(shape, fonts);
  if (!result.ok) return EMPTY;
  const { contours, points, fillRule } = result.value;
  return {
    contours,
    points,
    fillRule,
    lines: contours.map((contour) => flattenContour(contour, SEEN_TOLERANCE)),
  };
}

function turnDrawn({ contours, lines, points, fillRule }: Drawn, turner: Turner): Drawn {
  return {
    contours: contours.map(turner.contour),
    lines: lines.map((line) => ({ ...line, points: line.points.map(turner.point) })),
    points: points.map(turner.point),
    fillRule,
  };
}
