import { z } from 'zod';
import { displayName, length, lengthOrZero, rate } from './numbers';

const xyz = z.strictObject({ x: length, y: length, z: length });
const xyAndZ = z.strictObject({ xy: rate, z: rate });

export const controller = z.strictObject({
  dialect: z.enum(['grbl', 'linuxcnc', 'iso']),
  units: z.enum(['mm', 'in']).default('mm'),
  arcs: z.boolean().default(true),
  /** Default 4 in mm, 5 in inches, filled in by `resolveJob`. */
  decimals: z.int().min(3).max(6).optional(),
  toolChange: z.enum(['split', 'pause', 'm6']).default('split'),
  spinUp: z.number().min(0).max(600).default(3),
  lineNumbers: z.boolean().default(false),
});
/** What the machine's controller understands and how its programs are divided. */
export type Controller = z.infer<typeof controller>;

export const machine = z.strictObject({
  name: displayName,
  travel: xyz,
  rapid: xyAndZ,
  feedMax: xyAndZ,
  acceleration: xyAndZ,
  spindle: z.strictObject({ min: z.number().min(0).max(1_000_000), max: rate }),
  /** Safe height above the face, mm. */
  clearance: length,
  /** Height above the face where the plunge feed takes over from the rapid, mm. */
  approach: lengthOrZero,
  controller,
});
/** The router: mm, mm/min, mm/s², rpm. */
export type Machine = z.infer<typeof machine>;

const speeds = z.strictObject({
  rpm: rate,
  feed: rate,
  plunge: rate,
  stepdown: length,
  stepover: z.number().min(0.02).max(0.95),
});

const cutterCommon = {
  id: z.string().regex(/^[A-Za-z0-9_-]{1,40}$/),
  number: z.int().min(0).max(99_999),
  name: displayName,
  diameter: length,
  flutes: z.int().min(1).max(20).default(2),
  fluteLength: length,
  reach: length,
  shank: length,
  centreCutting: z.boolean().default(true),
  speeds,
};

export const cutter = z.discriminatedUnion('kind', [
  z.strictObject({ ...cutterCommon, kind: z.literal('flat') }),
  z.strictObject({ ...cutterCommon, kind: z.literal('ball') }),
  z.strictObject({
    ...cutterCommon,
    kind: z.literal('vbit'),
    /** Included angle, degrees. */
    angle: z.number().min(5).max(175),
    /** Diameter of the flat at the point, mm. */
    tip: lengthOrZero.default(0),
  }),
  z.strictObject({
    ...cutterCommon,
    kind: z.literal('drill'),
    /** Point angle, degrees. */
    angle: z.number().min(30).max(180).default(118),
  }),
]);
/** A cutter and the speeds it likes, mm, degrees, rpm, mm/min. */
export type Cutter = z.infer<typeof cutter>;
export type CutterKind = Cutter['kind'];
