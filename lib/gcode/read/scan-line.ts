import { ProgramError } from './program-error';

/** A letter with its number. */
export interface Word {
  readonly letter: string;
  readonly value: number;
  /** 1-based. */
  readonly column: number;
}

/** What stands on a line. */
export interface ScannedLine {
  readonly words: readonly Word[];
  readonly comments: readonly string[];
  /** The line is `%` alone. */
  readonly percent: boolean;
  /** The line begins with `/`. */
  readonly blockDelete: boolean;
  /** Number after N, or null. */
  readonly number: number | null;
}

/** NIST RS274NGC 3.3: longer lines need not be read by any controller. */
const LONGEST_LINE = 256;
const NUMBER = /[+-]?(?:\d[\d \t]*\.?[\d \t]*|\.[ \t]*\d[\d \t]*)/y;

/**
 * Divides one line into words and comments (NIST RS274NGC 3.3). Blanks mean nothing outside comments, letters may be
 * small. Throws {@link ProgramError} at the first character that cannot stand where it does.
 */
export function scanLine(text: string, line: number): ScannedLine {
  const raise = (index: number, sentence: string): never => {
    throw new ProgramError(line, index + 1, sentence);
  };
  if (text.length > LONGEST_LINE) raise(LONGEST_LINE, `The line is longer than ${LONGEST_LINE} characters.`);
  const words: Word[] = [];
  const comments: string[] = [];
  let number: number | null = null;
  let at = skipBlanks(text, 0);
  if (text.charAt(at) === '%') {
    if (text.slice(at + 1).trim() !== '') raise(at + 1, 'Nothing may follow % on its line.');
    return { words, comments, percent: true, blockDelete: false, number };
  }
  const blockDelete = text.charAt(at) === '/';
  if (blockDelete) at = skipBlanks(text, at + 1);
  while (at < text.length) {
    const letter = text.charAt(at);
    if (letter === '(') {
      const end = text.indexOf(')', at);
      if (end < 0) raise(at, 'A comment is not closed on its line.');
      const inner = text.slice(at + 1, end);
      if (inner.includes('(')) raise(at + 1 + inner.indexOf('('), 'A comment stands within a comment.');
      comments.push(inner);
      at = skipBlanks(text, end + 1);
      continue;
    }
    if (letter === ';') {
      comments.push(text.slice(at + 1).trim());
      break;
    }
    if (!/[A-Za-z]/.test(letter)) raise(at, `'${printable(letter)}' cannot stand here.`);
    const from = skipBlanks(text, at + 1);
    NUMBER.lastIndex = from;
    const found = NUMBER.exec(text)?.[0];
    if (found === undefined) raise(from, `'${letter.toUpperCase()}' needs a number.`);
    const value = Number((found ?? '').replace(/[ \t]/g, ''));
    if (!Number.isFinite(value)) raise(from, `'${found ?? ''}' is not a number.`);
    const word = { letter: letter.toUpperCase(), value, column: at + 1 };
    at = skipBlanks(text, from + (found ?? '').length);
    if (word.letter !== 'N') words.push(word);
    else if (words.length > 0 || number !== null) raise(word.column - 1, 'A line number must come first.');
    else number = value;
  }
  return { words, comments, percent: false, blockDelete, number };
}

function skipBlanks(text: string, at: number): number {
  let i = at;
  while (i < text.length && (text.charAt(i) === ' ' || text.charAt(i) === '\t')) i++;
  return i;
}

function printable(character: string): string {
  return /[ -~]/.test(character) ? character : `character ${character.charCodeAt(0)}`;
}
