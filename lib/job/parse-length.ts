import { fail, ok, type Result } from '@/lib/base/result';

/** What a bare number means in a field, and what its value is given in: mm for lengths, degrees for angles. */
export type FieldUnit = 'mm' | 'in' | 'deg' | 'count';

/** Exact by definition: international inch, 1959. */
export const MM_PER_INCH = 25.4;

const LENGTH_UNITS: Readonly<Record<string, number>> = {
  mm: 1,
  cm: 10,
  m: 1000,
  in: MM_PER_INCH,
  inch: MM_PER_INCH,
  '"': MM_PER_INCH,
  ft: 12 * MM_PER_INCH,
  "'": 12 * MM_PER_INCH,
};
const UNITS: Readonly<Record<FieldUnit, Readonly<Record<string, number>>>> = {
  mm: LENGTH_UNITS,
  in: LENGTH_UNITS,
  deg: { deg: 1, '°': 1 },
  count: {},
};
const BARE: Readonly<Record<FieldUnit, number>> = { mm: 1, in: MM_PER_INCH, deg: 1, count: 1 };
const LONGEST_TEXT = 200;
const DEEPEST_NESTING = 20;

/**
 * Reads what people type into a figure's field: `1/4in`, `1 1/2"`, `3/4 + 1/16 in`, `6,35`, `(120 - 2*8) / 3`.
 *
 * A number without a unit takes the next unit to its right in the same sum, else the field's. `+0.2`, `*2` and `/2` at
 * the start work on `current`; `-3` is the number −3 and `+-3` takes three away. Gives mm (degrees, a plain number);
 * fails with a sentence that says what to write instead. Nothing is evaluated as code.
 */
export function parseLength(text: string, unit: FieldUnit, current?: number): Result<number, string> {
  try {
    const value = new SumReader(tokensOf(text), unit).readAll(current);
    if (!Number.isFinite(value)) throw new Unreadable('This divides by nothing.');
    // 3/4 in is 19.05 mm, not 19.049999999999997: what people type has no more digits than these.
    return ok(Number(value.toPrecision(14)));
  } catch (error) {
    if (error instanceof Unreadable) return fail(error.message);
    throw error;
  }
}

class Unreadable extends Error {}

type Token =
  | { readonly kind: 'number'; readonly value: number }
  | { readonly kind: 'sign' | 'word'; readonly text: string };

const FRACTIONS: Readonly<Record<string, string>> = {
  '½': ' 1/2',
  '¼': ' 1/4',
  '¾': ' 3/4',
  '⅛': ' 1/8',
  '⅜': ' 3/8',
  '⅝': ' 5/8',
  '⅞': ' 7/8',
};
const SAME_SIGN: Readonly<Record<string, string>> = {
  '−': '-',
  '×': '*',
  '·': '*',
  '÷': '/',
  '″': '"',
  '”': '"',
  '′': "'",
  '’': "'",
};

function tokensOf(text: string): Token[] {
  if (text.length > LONGEST_TEXT) throw new Unreadable(`Write at most ${LONGEST_TEXT} characters.`);
  let rest = text
    .replace(/[½¼¾⅛⅜⅝⅞]/g, (sign) => FRACTIONS[sign] ?? sign)
    .replace(/[−×·÷″”′’]/g, (sign) => SAME_SIGN[sign] ?? sign)
    .trim()
    .toLowerCase();
  if (rest === '') throw new Unreadable('Write a number.');
  const tokens: Token[] = [];
  while (rest !== '') {
    const found = /^(?:([\d.,]+)|([-+*/()])|([a-zµ]+|["'°]))\s*/.exec(rest);
    if (!found) throw new Unreadable(`'${rest.slice(0, 1)}' is not part of a number or a sum.`);
    if (found[1] !== undefined) tokens.push({ kind: 'number', value: readNumber(found[1]) });
    else if (found[2] !== undefined) tokens.push({ kind: 'sign', text: found[2] });
    else tokens.push({ kind: 'word', text: found[3] ?? '' });
    rest = rest.slice(found[0].length);
  }
  return tokens;
}

function readNumber(text: string): number {
  const marks = text.replace(/\d/g, '');
  if (marks.length > 1) {
    const last = Math.max(text.lastIndexOf('.'), text.lastIndexOf(','));
    const plain = `${text.slice(0, last).replace(/[.,]/g, '')}${text.slice(last)}`;
    throw new Unreadable(`'${text}' could be two numbers: write ${plain} without a mark between thousands.`);
  }
  if (!/\d/.test(text)) throw new Unreadable(`'${text}' has no digits.`);
  return Number(text.replace(',', '.'));
}

/** A number and the unit that holds for it, as its length in mm (or 1 for a degree); null while none was named. */
interface Quantity {
  readonly value: number;
  readonly unit: number | null;
}

class SumReader {
  private at = 0;

  constructor(
    private readonly tokens: readonly Token[],
    private readonly unit: FieldUnit,
  ) {}

  readAll(current: number | undefined): number {
    const start = this.signHere();
    const relative = start === '+' || start === '*' || start === '/' ? start : null;
    if (relative) this.at++;
    const quantity = relative === '*' || relative === '/' ? this.readTerm(0) : this.readSum(0);
    const left = this.tokens[this.at];
    if (left) throw new Unreadable(`${describe(left)} does not belong there.`);
    if (!relative) return this.inField(quantity);
    if (current === undefined)
      throw new Unreadable(`There is no one value here for '${relative}' to work on.`);
    if (relative === '+') return current + this.inField(quantity);
    if (quantity.unit !== null)
      throw new Unreadable(`After '${relative}' write a plain number, without a unit.`);
    return relative === '*' ? current * quantity.value : current / quantity.value;
  }

  private inField({ value, unit }: Quantity): number {
    return value * (unit ?? BARE[this.unit]);
  }

  /** term (± term)*; terms without a unit wait for the next one that has one. */
  private readSum(depth: number): Quantity {
    let waiting = 0;
    let total: number | null = null;
    let sign = 1;
    for (;;) {
      const { value, unit } = this.readTerm(depth);
      waiting += sign * value;
      if (unit !== null) {
        total = (total ?? 0) + waiting * unit;
        waiting = 0;
      }
      const next = this.signHere();
      if (next !== '+' && next !== '-') break;
      sign = next === '+' ? 1 : -1;
      this.at++;
    }
    if (total === null) return { value: waiting, unit: null };
    return { value: total + waiting * BARE[this.unit], unit: 1 };
  }

  /** factor (*|/ factor)*, with at most one unit, which holds for the whole term: `1/4 in` is a quarter of an inch. */
  private readTerm(depth: number): Quantity {
    let { value, unit } = this.readFactor(depth);
    for (;;) {
      const sign = this.signHere();
      if (sign !== '*' && sign !== '/') return { value, unit };
      this.at++;
      const factor = this.readFactor(depth);
      if (factor.unit !== null && unit !== null)
        throw new Unreadable('This multiplies or divides two lengths: leave one unit out.');
      value = sign === '*' ? value * factor.value : value / factor.value;
      unit ??= factor.unit;
    }
  }

  private readFactor(depth: number): Quantity {
    if (depth > DEEPEST_NESTING) throw new Unreadable('There are too many brackets or signs.');
    const sign = this.signHere();
    if (sign === '-' || sign === '+') {
      this.at++;
      const { value, unit } = this.readFactor(depth + 1);
      return { value: sign === '-' ? -value : value, unit };
    }
    return this.withUnit(sign === '(' ? this.readBrackets(depth) : this.readMixed());
  }

  private readBrackets(depth: number): Quantity {
    this.at++;
    const inside = this.readSum(depth + 1);
    if (this.signHere() !== ')') throw new Unreadable('A bracket is not closed.');
    this.at++;
    return inside;
  }

  /** A number, or a whole number and a fraction: `1 1/2`. */
  private readMixed(): Quantity {
    const whole = this.numberAt(this.at);
    if (whole === null) {
      const token = this.tokens[this.at];
      throw new Unreadable(
        token ? `A number is missing before ${describe(token)}.` : 'A number is missing at the end.',
      );
    }
    this.at++;
    const top = this.numberAt(this.at);
    if (top === null) return { value: whole, unit: null };
    this.at++;
    const bottom = this.signHere() === '/' ? this.numberAt(this.at + 1) : null;
    if (bottom === null) throw new Unreadable('Two numbers stand side by side: put a sign between them.');
    this.at += 2;
    return { value: whole + top / bottom, unit: null };
  }

  private withUnit(quantity: Quantity): Quantity {
    const word = this.tokens[this.at];
    if (word?.kind !== 'word') return quantity;
    const unit = UNITS[this.unit][word.text];
    if (unit === undefined) throw new Unreadable(this.unknownUnit(word.text));
    if (quantity.unit !== null)
      throw new Unreadable(`'${word.text}' gives a second unit to the same number.`);
    this.at++;
    return { value: quantity.value, unit };
  }

  private unknownUnit(word: string): string {
    if (this.unit === 'deg') return `'${word}' is not a unit of angle: write degrees, like 45 or 45°.`;
    if (this.unit === 'count') return `'${word}' does not belong here: write a plain number.`;
    return `'${word}' is not a unit of length: use mm, cm, m, in or ft.`;
  }

  private signHere(): string | null {
    const token = this.tokens[this.at];
    return token?.kind === 'sign' ? token.text : null;
  }

  private numberAt(index: number): number | null {
    const token = this.tokens[index];
    return token?.kind === 'number' ? token.value : null;
  }
}

function describe(token: Token): string {
  return token.kind === 'number' ? `'${token.value}'` : `'${token.text}'`;
}
