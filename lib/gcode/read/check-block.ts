import { G_CODES, M_CODES, VALUE_LETTERS, type Code, type ModalGroup } from './codes';
import { ProgramError } from './program-error';
import type { Profile } from './profile';
import type { ScannedLine, Word } from './scan-line';

/** A line whose words are known, allowed and do not exclude one another. */
export interface Block {
  readonly line: number;
  /** The G or M word of each group that the line has, as its number (G38.2 is 38.2). */
  readonly codes: ReadonlyMap<ModalGroup, CodeWord>;
  readonly values: ReadonlyMap<string, Word>;
}

export interface CodeWord {
  readonly number: number;
  readonly column: number;
}

/** Groups of which a line may have one word each with no harm: none may be repeated. */
const MOST_M_WORDS = 4;

/** Checks the words of a line against the table of codes and the controller's profile. */
export function checkBlock(scanned: ScannedLine, line: number, profile: Profile): Block {
  const codes = new Map<ModalGroup, CodeWord>();
  const values = new Map<string, Word>();
  let mWords = 0;
  for (const word of scanned.words) {
    const { letter, value, column } = word;
    const raise = (sentence: string): never => {
      throw new ProgramError(line, column, sentence);
    };
    if (letter === 'G' || letter === 'M') {
      const name = letter + String(value);
      const code = codeOf(letter, value);
      if (!code || profile.unknown.has(name)) raise(`${name} is not a word that this controller knows.`);
      else if (code.refused !== undefined) raise(code.refused);
      else {
        const other = codes.get(code.group);
        if (other && !bothCoolants(code.group, other.number, value))
          raise(`${name} and ${letter}${other.number} exclude one another on a line (${code.group}).`);
        codes.set(code.group, { number: value, column });
      }
      if (letter === 'M' && ++mWords > MOST_M_WORDS) raise(`A line has at most ${MOST_M_WORDS} M words.`);
      continue;
    }
    if (letter === 'O' && !profile.programNumber) raise('O words are not known to this controller.');
    if (!VALUE_LETTERS.has(letter)) raise(`${letter} is not a word that a three-axis router knows.`);
    if (values.has(letter)) raise(`${letter} stands twice on this line.`);
    values.set(letter, word);
  }
  return { line, codes, values };
}

function codeOf(letter: 'G' | 'M', value: number): Code | undefined {
  return letter === 'G' ? G_CODES.get(Math.round(value * 10)) : M_CODES.get(value);
}

/** Mist and flood may both be on (NIST RS274NGC, table 4). */
function bothCoolants(group: ModalGroup, a: number, b: number): boolean {
  return group === 'coolant' && a !== b && a !== 9 && b !== 9;
}
