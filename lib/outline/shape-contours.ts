import { assertNever } from '@/lib/base/assert-never';
import { fail, ok, type Result } from '@/lib/base/result';
import type { Contour } from '@/lib/geometry/contour';
import { parseSvgPath } from '@/lib/geometry/svg-path';
import { vec, type Vec } from '@/lib/geometry/vec';
import type { Shape } from '@/lib/job/shape-schema';
import type { Problem } from '@/lib/report/problem';
import { findFont, type FontBook } from './fonts';
import { ellipseContour, polygonContour, rectContour } from './plain-shapes';
import { layOutText } from './text-layout';

/** A shape drawn out, in the view of its outline's face, mm, y up. */
export interface ShapeContours {
  /** In the order in which the shape draws them; tabs count them in this order. */
  readonly contours: readonly Contour[];
  /** Places of a `points` shape. */
  readonly points: readonly Vec[];
  readonly fillRule: 'nonzero' | 'evenodd';
  /**
   * How many contours, one after another, are filled together: a text's glyphs each for itself, since neighbours may
   * overlap and then count as one area; any other shape as a whole.
   */
  readonly groups: readonly number[];
  /** Characters that the font has not. */
  readonly missingGlyphs: readonly string[];
}

/**
 * Draws a shape. A problem's path is relative to the shape: `d` for path data that cannot be read, `font` for a font
 * that is not there.
 */
export function shapeContours(shape: Shape, fonts: FontBook): Result<ShapeContours, Problem> {
  switch (shape.type) {
    case 'path':
      return pathContours(shape);
    case 'rect':
      return ok(drawn([rectContour(shape)]));
    case 'ellipse':
      return ok(drawn([ellipseContour(shape)]));
    case 'polygon':
      return ok(drawn([polygonContour(shape)]));
    case 'points':
      return ok({ ...drawn([]), points: shape.at.map(([x, y]) => vec(x, y)) });
    case 'text':
      return textContours(shape, fonts);
    default:
      return assertNever(shape, 'shape');
  }
}

function drawn(contours: readonly Contour[]): ShapeContours {
  return { contours, points: [], fillRule: 'nonzero', groups: [contours.length], missingGlyphs: [] };
}

function pathContours(shape: Extract<Shape, { type: 'path' }>): Result<ShapeContours, Problem> {
  const parsed = parseSvgPath(shape.d);
  if (!parsed.ok) {
    const { offset, message } = parsed.error;
    return fail({ path: 'd', message: `at character ${offset + 1}: ${message}` });
  }
  if (parsed.value.length === 0) return fail({ path: 'd', message: 'draws nothing.' });
  return ok({ ...drawn(parsed.value), fillRule: shape.fillRule });
}

function textContours(
  shape: Extract<Shape, { type: 'text' }>,
  fonts: FontBook,
): Result<ShapeContours, Problem> {
  const font = findFont(fonts, shape.font);
  if (!font.ok) return fail({ path: 'font', message: font.error });
  const { glyphs, missing } = layOutText(shape, font.value);
  return ok({
    ...drawn(glyphs.flat()),
    groups: glyphs.map((contours) => contours.length),
    missingGlyphs: missing,
  });
}
