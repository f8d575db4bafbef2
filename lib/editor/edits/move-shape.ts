import { assertNever } from '@/lib/base/assert-never';
import { contoursToPathData } from '@/lib/geometry/path-data';
import { parseSvgPath } from '@/lib/geometry/svg-path';
import { transformContour, transformPoint, type Matrix } from '@/lib/geometry/transform';
import type { Shape } from '@/lib/job/shape-schema';

/** The shape moved by (dx, dy) mm in its own view. */
export function moveShape(shape: Shape, dx: number, dy: number): Shape {
  switch (shape.type) {
    case 'rect':
    case 'text':
      return { ...shape, x: shape.x + dx, y: shape.y + dy };
    case 'ellipse':
    case 'polygon':
      return { ...shape, cx: shape.cx + dx, cy: shape.cy + dy };
    case 'path':
    case 'points':
      return transformFree(shape, [1, 0, 0, 1, dx, dy]);
    default:
      return assertNever(shape, 'shape');
  }
}

/** A path or points, which have no numbers of their own to keep, carried through `matrix`. */
export function transformFree<S extends Extract<Shape, { type: 'path' | 'points' }>>(
  shape: S,
  matrix: Matrix,
): S {
  if (shape.type === 'points') {
    const at = shape.at.map(([x, y]): [number, number] => {
      const moved = transformPoint({ x, y }, matrix);
      return [moved.x, moved.y];
    });
    return { ...shape, at };
  }
  const parsed = parseSvgPath(shape.d);
  // Data that cannot be read draws nothing, so nothing moves; the finding about it names the place.
  if (!parsed.ok) return shape;
  return {
    ...shape,
    d: contoursToPathData(parsed.value.map((contour) => transformContour(contour, matrix))),
  };
}
