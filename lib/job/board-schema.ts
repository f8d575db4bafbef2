import { z } from 'zod';
import { coordinate, length, lengthOrZero } from './numbers';

/** Three feeler readings across the board: heights against the nominal face, mm. */
export const cupSurface = z.strictObject({
  kind: z.literal('cup'),
  across: z.enum(['x', 'y']),
  readings: z.tuple([coordinate, coordinate, coordinate]),
});

/** Probed heights at grid nodes; `z` holds rows by y, each with one height a value of `x`. */
export const gridSurface = z.strictObject({
  kind: z.literal('grid'),
  x: z.array(coordinate).min(1).max(200),
  y: z.array(coordinate).min(1).max(200),
  z: z.array(z.array(coordinate)).min(1).max(200),
});

export const surface = z.discriminatedUnion('kind', [cupSurface, gridSurface]).nullable();
/** What was measured of one face, in that face's view, or null where it is taken as flat. */
export type Surface = z.infer<typeof surface>;

export const board = z.strictObject({
  x: length,
  y: length,
  z: length,
  material: z.string().max(80).default(''),
  grain: z.enum(['x', 'y']).default('x'),
  surface: z
    .strictObject({ A: surface.default(null), B: surface.default(null) })
    .default({ A: null, B: null }),
});
/** The board: fills 0…x, 0…y, 0…z, mm. `grain` is the axis along which the fibres run. */
export type Board = z.infer<typeof board>;

export const clamp = z.strictObject({
  x: coordinate,
  y: coordinate,
  width: length,
  depth: length,
  height: length,
});
/** A clamp's box in the view of the face being cut; `height` is above the bed. */
export type Clamp = z.infer<typeof clamp>;

export const corner = z.enum(['front-left', 'front-right', 'back-left', 'back-right', 'center']);
/** Where a program's X0 Y0 is, named in its face's view: `front` = small y, `left` = small x. */
export type Corner = z.infer<typeof corner>;

export const setup = z.strictObject({
  zero: z.strictObject({ corner, z: z.enum(['surface', 'bed']) }),
  clamps: z.array(clamp).max(50).default([]),
});
/** How one face is held and zeroed. */
export type Setup = z.infer<typeof setup>;

export const pin = z.strictObject({
  x: coordinate,
  y: coordinate,
  diameter: length,
  depth: lengthOrZero,
});
/** A registration dowel, in A's view; `depth` is how deep it stands in the spoilboard. */
export type Pin = z.infer<typeof pin>;
