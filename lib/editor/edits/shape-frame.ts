import { assertNever } from '@/lib/base/assert-never';
import type { Box } from '@/lib/geometry/contour';
import { flattenContour } from '@/lib/geometry/flatten';
import { pointsBox } from '@/lib/geometry/measure';
import { DEGREES, vec, type Vec } from '@/lib/geometry/vec';
import type { Shape } from '@/lib/job/shape-schema';
import type { FontBook } from '@/lib/outline/fonts';
import { shapeContours } from '@/lib/outline/shape-contours';
import { moveShape, transformFree } from './move-shape';

/**
 * The figures by which a shape is placed: lower left corner and size before it is turned, mm, and its angle in degrees
 * counter-clockwise. Paths and points keep no angle: theirs is always 0, and a typed one turns them by that much.
 */
export interface Frame {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  readonly angle: number;
}

/** Fine enough that a box is right to the micrometre. */
const BOX_TOLERANCE = 0.0005;

/** The frame of a shape, or null where it draws nothing. */
export function shapeFrame(shape: Shape, fonts: FontBook): Frame | null {
  switch (shape.type) {
    case 'rect':
      return { x: shape.x, y: shape.y, width: shape.width, height: shape.height, angle: shape.rotate };
    case 'ellipse':
      return centred(shape, shape.rx, shape.ry, shape.rotate);
    case 'polygon':
      return centred(shape, shape.radius, shape.radius, shape.rotate);
    case 'text':
    case 'path':
    case 'points': {
      const box = drawnBox(shape, fonts);
      return box && framed(box, shape.type === 'text' ? shape.rotate : 0);
    }
    default:
      return assertNever(shape, 'shape');
  }
}

/** The box of what a shape draws, turned as it is, or null where it draws nothing. */
export function drawnBox(shape: Shape, fonts: FontBook): Box | null {
  const drawn = shapeContours(shape, fonts);
  if (!drawn.ok) return null;
  const lines = drawn.value.contours.flatMap((contour) => flattenContour(contour, BOX_TOLERANCE).points);
  const points: Vec[] = [...lines, ...drawn.value.points];
  return points.length > 0 ? pointsBox(points) : null;
}

/** The shape with some figures of its frame changed. Sizes must be above 0; what cannot be stretched stays in shape. */
export function setShapeFrame(shape: Shape, change: Partial<Frame>, fonts: FontBook): Shape {
  const before = shapeFrame(shape, fonts);
  if (!before) return shape;
  const frame = { ...before, ...change };
  switch (shape.type) {
    case 'rect': {
      const { x, y, width, height, angle } = frame;
      return { ...shape, x, y, width, height, rotate: angle };
    }
    case 'ellipse':
      return { ...shape, ...middle(frame), rx: frame.width / 2, ry: frame.height / 2, rotate: frame.angle };
    case 'polygon': {
      const size = (change.height ?? change.width ?? before.width) / 2;
      const square = { ...frame, width: 2 * size, height: 2 * size };
      return { ...shape, ...middle(square), radius: size, rotate: frame.angle };
    }
    case 'text':
      return setTextFrame(shape, before, change, fonts);
    case 'path':
    case 'points':
      return setFreeFrame(shape, before, frame);
    default:
      return assertNever(shape, 'shape');
  }
}

function setTextFrame(
  shape: Extract<Shape, { type: 'text' }>,
  before: Frame,
  change: Partial<Frame>,
  fonts: FontBook,
): Shape {
  const ratio =
    change.height !== undefined && before.height > 0
      ? change.height / before.height
      : change.width !== undefined && before.width > 0
        ? change.width / before.width
        : 1;
  const resized = {
    ...shape,
    size: shape.size * ratio,
    letterSpacing: shape.letterSpacing * ratio,
    rotate: change.angle ?? shape.rotate,
  };
  const after = shapeFrame(resized, fonts);
  if (!after || (change.angle !== undefined && change.x === undefined && change.y === undefined))
    return resized;
  return moveShape(resized, (change.x ?? before.x) - after.x, (change.y ?? before.y) - after.y);
}

function setFreeFrame<S extends Extract<Shape, { type: 'path' | 'points' }>>(
  shape: S,
  before: Frame,
  to: Frame,
): S {
  const sx = before.width > 0 ? to.width / before.width : 1;
  const sy = before.height > 0 ? to.height / before.height : 1;
  const placed = transformFree(shape, [sx, 0, 0, sy, to.x - before.x * sx, to.y - before.y * sy]);
  if (to.angle === 0) return placed;
  const { cx, cy } = middle(to);
  const c = Math.cos(to.angle * DEGREES);
  const s = Math.sin(to.angle * DEGREES);
  return transformFree(placed, [c, s, -s, c, cx - cx * c + cy * s, cy - cx * s - cy * c]);
}

function centred({ cx, cy }: { cx: number; cy: number }, rx: number, ry: number, angle: number): Frame {
  return { x: cx - rx, y: cy - ry, width: 2 * rx, height: 2 * ry, angle };
}

function framed({ minX, minY, maxX, maxY }: Box, angle: number): Frame {
  return { x: minX, y: minY, width: maxX - minX, height: maxY - minY, angle };
}

function middle({ x, y, width, height }: Frame): { cx: number; cy: number } {
  return { cx: x + width / 2, cy: y + height / 2 };
}

/** The middle of a frame. */
export function frameMiddle(frame: Frame): Vec {
  const { cx, cy } = middle(frame);
  return vec(cx, cy);
}
