import { z } from 'zod';
import { degrees, displayName, face, id, length, lengthOrZero, rate, stepover } from './numbers';

const depth = length;
const depthOrThrough = z.union([length, z.literal('through')]);
const side = z.enum(['outside', 'inside', 'on']);
const direction = z.enum(['climb', 'conventional']);
const relief = z.enum(['none', 'dogbone']);

const outlines = z.array(id).min(1).max(5000);

const common = {
  id,
  name: displayName.default(''),
  face,
  outlines,
  cutter: id,
  enabled: z.boolean().default(true),
  /** The cut begins this far below the face; what is above is taken as gone. */
  start: lengthOrZero.default(0),
  /** Whether the cut follows the measured surface; the default depends on kind and board, see `resolveJob`. */
  follow: z.enum(['flat', 'surface']).optional(),
  /** These four override the cutter's own speeds. */
  feed: rate.optional(),
  plunge: rate.optional(),
  rpm: rate.optional(),
  stepdown: length.optional(),
};

/** How much deeper than the far face a through cut goes; 0.3, or 0 with a skin, see `resolveJob`. */
const below = lengthOrZero.optional();

const entry = z
  .strictObject({
    type: z.enum(['plunge', 'ramp', 'helix']).default('ramp'),
    /** Slope of a ramp or helix, degrees. */
    angle: z.number().min(0.1).max(89).default(5),
  })
  .default({ type: 'ramp', angle: 5 });
/** How the cutter goes down into the wood. */
export type Entry = z.infer<typeof entry>;

const lead = z
  .strictObject({
    type: z.enum(['none', 'line', 'arc']).default('none'),
    length: lengthOrZero.default(0),
  })
  .default({ type: 'none', length: 0 });
/** How a profile pass comes onto the outline and leaves it. */
export type Lead = z.infer<typeof lead>;

const placement = z.discriminatedUnion('type', [
  z.strictObject({ type: z.literal('count'), count: z.int().min(1).max(500) }),
  z.strictObject({ type: z.literal('spacing'), spacing: length }),
  z.strictObject({
    type: z.literal('at'),
    at: z
      .array(
        z.strictObject({
          outline: id,
          contour: z.int().min(0).max(1_000_000).default(0),
          fraction: z.number().min(0).max(1),
        }),
      )
      .max(2000),
  }),
]);

export const tabs = z.strictObject({
  /** Length of the wood left, at its top, mm. */
  length,
  /** Height of the top above the far face, mm, or worked out from the far face's cuts. */
  height: z.union([length, z.literal('auto')]),
  /** Wood that must really be left under the top, mm. */
  hold: lengthOrZero.default(3),
  /** Slope of the ends, degrees; 90 = square. */
  slope: z.number().min(5).max(90).default(90),
  placement,
});
/** Wood left standing in a profile's kerf to hold the part. */
export type Tabs = z.infer<typeof tabs>;

export const pocketCut = z.strictObject({
  ...common,
  kind: z.literal('pocket'),
  depth: depthOrThrough,
  below,
  pattern: z.enum(['contour', 'raster']).default('contour'),
  angle: degrees.default(0),
  stepover: stepover.optional(),
  direction: direction.default('climb'),
  entry,
  allowance: lengthOrZero.default(0),
  finish: z.boolean().default(false),
  rest: id.nullable().default(null),
  relief: relief.default('none'),
  runOut: z.boolean().default(true),
});

export const profileCut = z.strictObject({
  ...common,
  kind: z.literal('profile'),
  depth: depthOrThrough,
  below,
  side,
  direction: direction.default('climb'),
  entry,
  lead,
  allowance: lengthOrZero.default(0),
  finish: z.boolean().default(false),
  skin: lengthOrZero.default(0),
  corners: z.enum(['round', 'sharp']).default('round'),
  relief: relief.default('none'),
  tabs: tabs.nullable().default(null),
});

export const chamferCut = z.strictObject({
  ...common,
  kind: z.literal('chamfer'),
  side: z.enum(['outside', 'inside']),
  width: length,
  /** How far the point goes beneath the bevel's lower edge, mm. */
  beneath: lengthOrZero.default(0.5),
});

export const engraveCut = z.strictObject({
  ...common,
  kind: z.literal('engrave'),
  depth: depthOrThrough,
  below,
});

export const taperEngraveCut = z.strictObject({
  ...common,
  kind: z.literal('taper-engrave'),
  depth,
  /** Id of a flat cutter that clears the floor where the depth limit makes one. */
  floor: id.nullable().default(null),
});

export const drillCut = z.strictObject({
  ...common,
  kind: z.literal('drill'),
  depth: depthOrThrough,
  below,
  /** Depth of each peck, mm; 0 drills in one go. */
  peck: lengthOrZero.default(0),
  /** Seconds at the bottom. */
  dwell: z.number().min(0).max(600).default(0),
});

export const boreCut = z.strictObject({
  ...common,
  kind: z.literal('bore'),
  depth: depthOrThrough,
  below,
  pitch: length.optional(),
});

export const surfaceCut = z.strictObject({
  ...common,
  kind: z.literal('surface'),
  /** None: the whole board. */
  outlines: z.array(id).max(5000).default([]),
  depth,
  angle: degrees.default(0),
  stepover: stepover.optional(),
});

export const cut = z.discriminatedUnion('kind', [
  pocketCut,
  profileCut,
  chamferCut,
  engraveCut,
  taperEngraveCut,
  drillCut,
  boreCut,
  surfaceCut,
]);
/** One cut: what is cut, on which face, with which cutter and how deep. */
export type Cut = z.infer<typeof cut>;
export type CutKind = Cut['kind'];
export type CutOf<Kind extends CutKind> = Extract<Cut, { kind: Kind }>;
