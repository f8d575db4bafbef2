import type { Controller } from '@/lib/job/machine-schema';

/** What one family of controllers is given: a table, so that a difference between two is one line here. */
export interface Dialect {
  /** Marks the file's first and last line. */
  readonly percent: boolean;
  /** A program number (`O0001`) on a line of its own. */
  readonly programNumber: boolean;
  /** Whether the arc distance mode has a word (G91.1); without it I and J are incremental anyway. */
  readonly arcModeWord: boolean;
  /** Path tolerance in mm for a blending mode that needs one said (G64 P). */
  readonly blend: number | null;
  /** Whether `Tn M6` is known, and whether the tool's length is then taken with `G43 Hn`. */
  readonly toolChange: boolean;
  readonly toolLength: boolean;
  /** Longest line, comments too. */
  readonly lineLength: number;
  /** Comments in capitals. */
  readonly capitals: boolean;
}

/** Sources of each line: NIST RS274NGC version 3, the controllers' own documentation; ISO 6983 by common practice. */
export const DIALECTS: Readonly<Record<Controller['dialect'], Dialect>> = {
  grbl: {
    percent: false,
    programNumber: false,
    arcModeWord: true,
    blend: null,
    toolChange: false,
    toolLength: false,
    lineLength: 70,
    capitals: false,
  },
  linuxcnc: {
    percent: false,
    programNumber: false,
    arcModeWord: true,
    blend: 0.01,
    toolChange: true,
    toolLength: true,
    lineLength: 120,
    capitals: false,
  },
  iso: {
    percent: true,
    programNumber: true,
    arcModeWord: false,
    blend: null,
    toolChange: true,
    toolLength: false,
    lineLength: 80,
    capitals: true,
  },
};
