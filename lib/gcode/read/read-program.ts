import { Interpreter } from './interpreter';
import { PROFILES, type ReadDialect } from './profile';
import { ProgramError } from './program-error';
import type { ProgramEvent } from './program-event';

export interface ReadOptions {
  /** Whose rules hold; `any` by default. */
  readonly dialect?: ReadDialect;
}

/**
 * Reads a program, line by line, as what the machine will do. `source` is its text, or its lines as they come from a
 * file of any size; nothing is kept of what was read. Throws {@link ProgramError} with line and column.
 *
 * A program must end with M2 or M30 (or a second %): a file that was cut short leaves the spindle turning.
 */
export function* readProgram(
  source: string | Iterable<string>,
  options: ReadOptions = {},
): Generator<ProgramEvent> {
  const interpreter = new Interpreter(PROFILES[options.dialect ?? 'any']);
  let line = 0;
  for (const text of typeof source === 'string' ? linesOf(source) : source) {
    line++;
    yield* interpreter.read(text);
    if (interpreter.isEnded) return;
  }
  throw new ProgramError(line + 1, 1, 'The program has no end (M2 or M30); part of the file may be missing.');
}

/** Lines of a text without splitting it whole: CR, LF or both end one. */
export function* linesOf(text: string): Generator<string> {
  let from = 0;
  while (from < text.length) {
    let to = text.indexOf('\n', from);
    if (to < 0) to = text.length;
    const end = to > from && text.charCodeAt(to - 1) === 13 ? to - 1 : to;
    yield text.slice(from, end);
    from = to + 1;
  }
}
