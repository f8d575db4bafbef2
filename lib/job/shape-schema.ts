import { z } from 'zod';
import { coordinate, degrees, displayName, face, id, length, lengthOrZero } from './numbers';

/** Fonts that ship with the product; `line` is a single-line font whose glyphs are open paths. */
export const FONT_IDS = ['sans', 'serif', 'slab', 'script', 'stencil', 'line'] as const;
export type FontId = (typeof FONT_IDS)[number];

export const pathShape = z.strictObject({
  type: z.literal('path'),
  /** SVG path data, every command, with y up. */
  d: z.string().min(1).max(5_000_000),
  fillRule: z.enum(['nonzero', 'evenodd']).default('nonzero'),
});

export const rectShape = z.strictObject({
  type: z.literal('rect'),
  x: coordinate,
  y: coordinate,
  width: length,
  height: length,
  radius: lengthOrZero.default(0),
  rotate: degrees.default(0),
});

export const ellipseShape = z.strictObject({
  type: z.literal('ellipse'),
  cx: coordinate,
  cy: coordinate,
  rx: length,
  ry: length,
  rotate: degrees.default(0),
});

export const polygonShape = z.strictObject({
  type: z.literal('polygon'),
  cx: coordinate,
  cy: coordinate,
  radius: length,
  sides: z.int().min(3).max(1000),
  rotate: degrees.default(0),
});

export const pointsShape = z.strictObject({
  type: z.literal('points'),
  at: z
    .array(z.tuple([coordinate, coordinate]))
    .min(1)
    .max(50_000),
});

export const textShape = z.strictObject({
  type: z.literal('text'),
  text: z.string().min(1).max(5000),
  /** A font of the catalogue; checked against it by name, so that the problem can name the font. */
  font: z.string().min(1).max(80),
  /** Size of the em, mm. */
  size: length,
  /** Start of the base line. */
  x: coordinate,
  y: coordinate,
  align: z.enum(['left', 'center', 'right']).default('left'),
  rotate: degrees.default(0),
  /** Added after every glyph, mm. */
  letterSpacing: coordinate.default(0),
  /** Distance of base lines as a multiple of `size`. */
  lineHeight: z.number().positive().max(20).default(1.2),
});

export const shape = z.discriminatedUnion('type', [
  pathShape,
  rectShape,
  ellipseShape,
  polygonShape,
  pointsShape,
  textShape,
]);
/** What is drawn, in the view of the outline's face, mm, y up, angles counter-clockwise. */
export type Shape = z.infer<typeof shape>;
export type ShapeType = Shape['type'];

export const outline = z.strictObject({ id, name: displayName.default(''), face, shape });
/** A drawn shape with a name, in the view of one face; cuts on either face may use it. */
export type Outline = z.infer<typeof outline>;
