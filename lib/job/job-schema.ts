import { z } from 'zod';
import { board, pin, setup } from './board-schema';
import { cut } from './cut-schema';
import { cutter, machine } from './machine-schema';
import { displayName, face } from './numbers';
import { outline } from './shape-schema';

export const JOB_FORMAT = 'spindleaf-job';
export const JOB_VERSION = 1;

/**
 * The whole job document. Every number is in mm, degrees, mm/min, rpm or seconds whatever `display` says. References
 * between its parts are checked by `checkReferences`; read documents through `parseJob`, which does both.
 */
export const jobSchema = z.strictObject({
  format: z.literal(JOB_FORMAT),
  version: z.literal(JOB_VERSION),
  name: displayName.min(1),
  display: z.enum(['mm', 'in']).default('mm'),
  board,
  turn: z.strictObject({ axis: z.enum(['x', 'y']) }).default({ axis: 'x' }),
  pins: z.array(pin).max(50).default([]),
  order: z.array(face).min(1).max(2),
  setups: z.strictObject({ A: setup.optional(), B: setup.optional() }),
  machine,
  cutters: z.array(cutter).max(500),
  outlines: z.array(outline).max(20_000),
  cuts: z.array(cut).max(2000),
});

/** A job document with its plain defaults filled in; `resolveJob` fills those that depend on other fields. */
export type Job = z.infer<typeof jobSchema>;
/** A job document as a file may hold it, defaults left out. */
export type JobInput = z.input<typeof jobSchema>;

export type DisplayUnit = Job['display'];
export type TurnAxis = Job['turn']['axis'];
