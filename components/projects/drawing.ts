import type { Result } from '@/lib/base/result';
import type { JobInput } from '@/lib/job/job-schema';

/** A drawing file as outlines of a job, in mm, y up, its lower left corner at `at`. */
export interface Drawing {
  readonly outlines: JobInput['outlines'];
  /** What the outlines span, mm. */
  readonly size: { readonly width: number; readonly height: number };
  /** What the file holds that no outline can say, a sentence each with the place in the file. */
  readonly leftOut: readonly { readonly what: string; readonly where: string }[];
}

export interface Placing {
  /** 1 = as large as the file says. */
  readonly scale: number;
  readonly at: { readonly x: number; readonly y: number };
}

/** Reads a drawing's text; fails with a sentence that says what to do. */
export type ReadDrawing = (text: string, placing: Placing) => Result<Drawing, string>;

/** Files above this are refused before they are read, bytes. */
export const LARGEST_DRAWING = 10 * 1024 * 1024;

/** Wood left round the drawing on the board that is proposed, mm. */
export const MARGIN = 10;

/** The file's name without its ending, as a first name for the project. */
export function nameOfFile(fileName: string): string {
  return fileName
    .replace(/\.[^.]*$/, '')
    .replaceAll('_', ' ')
    .trim()
    .slice(0, 80);
}
