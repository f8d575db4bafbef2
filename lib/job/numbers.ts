import { z } from 'zod';

/** Largest length or coordinate that a document may hold, mm: far beyond any router, small enough to stay exact. */
export const LARGEST_LENGTH = 100_000;

/** Any finite length or coordinate, mm. NaN and infinities are refused by zod itself. */
export const coordinate = z.number().min(-LARGEST_LENGTH).max(LARGEST_LENGTH);

/** A length above nothing, mm. */
export const length = z.number().positive().max(LARGEST_LENGTH);

/** A length that may be nothing, mm. */
export const lengthOrZero = z.number().min(0).max(LARGEST_LENGTH);

/** A number above nothing in some other unit: mm/min, mm/s², rpm. */
export const rate = z.number().positive().max(10_000_000);

/** Counter-clockwise degrees. */
export const degrees = z.number().min(-36_000).max(36_000);

/** Share of the cutter's diameter between two passes. */
export const stepover = z.number().min(0.02).max(0.95);

/** Ids become file names and key the document, so they are plain. */
export const id = z.string().regex(/^[A-Za-z0-9_-]{1,40}$/);

/** A name for people: one line, no control characters, which could act on a terminal or a controller. */
export const displayName = z
  .string()
  .max(200)

  .regex(/^[^\u0000-\u001f\u007f]*$/);

export const face = z.enum(['A', 'B']);
/** Which face of the board: A is the one planned first by people, B what is seen after the turn. */
export type Face = z.infer<typeof face>;
