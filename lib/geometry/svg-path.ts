import { fail, ok, type Result } from '@/lib/base/result';
import { SAME_POINT } from '@/lib/base/tolerances';
import type { Contour, Segment } from './contour';
import { svgArcSegments } from './svg-arc';
import { DEGREES, distance, lerp, type Vec } from './vec';

/** Where path data cannot be read: the 0-based character and a sentence. */
export interface PathDataProblem {
  readonly offset: number;
  readonly message: string;
}

/** Beyond this no coordinate is a length that anybody draws; it would only lose the small ones. */
const LARGEST = 1e7;

/**
 * Reads SVG path data (SVG 2, section 9.3): every command, relative and absolute, with y as it is given. With y up an
 * arc's sweep flag 1 is counter-clockwise. Circular arcs stay exact, elliptical ones become cubics within 1e-7 of the
 * larger radius, quadratics become cubics exactly.
 *
 * A contour is closed by Z, or where its end lies on its start. Data with an error give no contours but the problem.
 */
export function parseSvgPath(d: string): Result<Contour[], PathDataProblem> {
  const reader = new PathReader(d);
  try {
    return ok(reader.readAll());
  } catch (error) {
    if (error instanceof PathError) return fail({ offset: error.offset, message: error.message });
    throw error;
  }
}

class PathError extends Error {
  constructor(
    readonly offset: number,
    message: string,
  ) {
    super(message);
  }
}

const ARGUMENTS: Readonly<Record<string, number>> = {
  M: 2,
  L: 2,
  H: 1,
  V: 1,
  C: 6,
  S: 4,
  Q: 4,
  T: 2,
  A: 7,
  Z: 0,
};
const NUMBER = /[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?/y;
const BLANK = /[ \t\r\n\f]*/y;
const BLANK_OR_COMMA = /[ \t\r\n\f]*,?[ \t\r\n\f]*/y;

class PathReader {
  private at = 0;
  private readonly contours: Contour[] = [];
  private start: Vec = { x: 0, y: 0 };
  private here: Vec = { x: 0, y: 0 };
  private segments: Segment[] = [];
  /** A contour was begun with M, or goes on after Z from where it began. */
  private open = false;
  /** Handle of the last cubic or quadratic, for S and T. */
  private lastCubic: Vec | null = null;
  private lastQuadratic: Vec | null = null;

  constructor(private readonly d: string) {}

  readAll(): Contour[] {
    this.skip(BLANK);
    if (this.at >= this.d.length) return [];
    let isFirst = true;
    while (this.at < this.d.length) {
      const offset = this.at;
      const letter = this.d.charAt(this.at);
      if (!(letter.toUpperCase() in ARGUMENTS)) throw new PathError(offset, this.unexpected(letter, isFirst));
      if (isFirst && letter.toUpperCase() !== 'M')
        throw new PathError(offset, 'path data must begin with M.');
      isFirst = false;
      this.at++;
      this.readCommand(letter, offset);
    }
    this.endContour(false);
    return this.contours;
  }

  private unexpected(letter: string, isFirst: boolean): string {
    if (isFirst) return 'path data must begin with M.';
    return /[0-9.+-]/.test(letter) ? 'there is a number too many.' : `'${letter}' is not a path command.`;
  }

  /** One letter with all its argument sets. */
  private readCommand(letter: string, offset: number): void {
    const count = ARGUMENTS[letter.toUpperCase()] ?? 0;
    if (count === 0) {
      this.skip(BLANK);
      return this.closePath();
    }
    let command = letter;
    do {
      const values: number[] = [];
      for (let i = 0; i < count; i++) values.push(this.readArgument(command, i, offset));
      this.perform(command, values);
      // Further pairs after a move are lines (SVG 2, 9.3.3).
      if (command === 'M') command = 'L';
      if (command === 'm') command = 'l';
    } while (this.numberFollows());
  }

  private numberFollows(): boolean {
    const before = this.at;
    this.skip(BLANK_OR_COMMA);
    const follows = /[0-9.+-]/.test(this.d.charAt(this.at));
    if (!follows) {
      const hasComma = this.d.slice(before, this.at).includes(',');
      if (hasComma) throw new PathError(this.at, 'a number is missing after the comma.');
    }
    return follows;
  }

  private readArgument(command: string, index: number, offset: number): number {
    this.skip(index === 0 ? BLANK : BLANK_OR_COMMA);
    if (command.toUpperCase() === 'A' && (index === 3 || index === 4)) return this.readFlag();
    NUMBER.lastIndex = this.at;
    const text = NUMBER.exec(this.d)?.[0];
    if (text === undefined) {
      const what = this.at >= this.d.length ? 'the data end' : `'${this.d.charAt(this.at)}' stands`;
      throw new PathError(this.at, `${what} where '${this.d.charAt(offset)}' needs a number.`);
    }
    const value = Number(text);
    if (!(Math.abs(value) <= LARGEST)) throw new PathError(this.at, `${text} is too large for a coordinate.`);
    this.at += text.length;
    return value;
  }

  /** The flags of an arc may be written without anything between them and what follows. */
  private readFlag(): number {
    const flag = this.d.charAt(this.at);
    if (flag !== '0' && flag !== '1') throw new PathError(this.at, 'an arc needs a flag, 0 or 1, here.');
    this.at++;
    return Number(flag);
  }

  private skip(pattern: RegExp): void {
    pattern.lastIndex = this.at;
    this.at += pattern.exec(this.d)?.[0].length ?? 0;
  }

  private perform(command: string, v: readonly number[]): void {
    const isRelative = command !== command.toUpperCase();
    const base = isRelative ? this.here : { x: 0, y: 0 };
    const point = (i: number): Vec => ({ x: base.x + (v[i] ?? 0), y: base.y + (v[i + 1] ?? 0) });
    switch (command.toUpperCase()) {
      case 'M':
        return this.moveTo(point(0));
      case 'L':
        return this.add({ kind: 'line', to: point(0) });
      case 'H':
        return this.add({ kind: 'line', to: { x: base.x + (v[0] ?? 0), y: this.here.y } });
      case 'V':
        return this.add({ kind: 'line', to: { x: this.here.x, y: base.y + (v[0] ?? 0) } });
      case 'C':
        return this.cubicTo(point(0), point(2), point(4));
      case 'S':
        return this.cubicTo(this.mirrored(this.lastCubic), point(0), point(2));
      case 'Q':
        return this.quadraticTo(point(0), point(2));
      case 'T':
        return this.quadraticTo(this.mirrored(this.lastQuadratic), point(0));
      default:
        return this.arcTo(v, point(5));
    }
  }

  private moveTo(to: Vec): void {
    this.endContour(false);
    this.start = to;
    this.here = to;
    this.open = true;
    this.forgetHandles();
  }

  private cubicTo(control1: Vec, control2: Vec, to: Vec): void {
    this.add({ kind: 'cubic', control1, control2, to });
    this.lastCubic = control2;
  }

  /** A quadratic is the cubic whose handles lie two thirds of the way to its one. */
  private quadraticTo(control: Vec, to: Vec): void {
    this.add({
      kind: 'cubic',
      control1: lerp(this.here, control, 2 / 3),
      control2: lerp(to, control, 2 / 3),
      to,
    });
    this.lastQuadratic = control;
  }

  private arcTo([rx, ry, rotation, largeArc, sweep]: readonly number[], to: Vec): void {
    const arc = {
      rx: Math.abs(rx ?? 0),
      ry: Math.abs(ry ?? 0),
      rotation: (rotation ?? 0) * DEGREES,
      largeArc: largeArc === 1,
      sweep: sweep === 1,
      to,
    };
    for (const segment of svgArcSegments(this.here, arc)) this.add(segment);
    this.forgetHandles();
  }

  /** Handles of S and T mirror the last one of their own kind, else stand on the point itself. */
  private mirrored(handle: Vec | null): Vec {
    return handle ? { x: 2 * this.here.x - handle.x, y: 2 * this.here.y - handle.y } : this.here;
  }

  private add(segment: Segment): void {
    if (!this.open) {
      // After Z a path goes on from where the closed one began.
      this.start = this.here;
      this.open = true;
    }
    const isNothing = segment.kind === 'line' && segment.to.x === this.here.x && segment.to.y === this.here.y;
    if (!isNothing) this.segments.push(segment);
    this.here = segment.to;
    this.forgetHandles();
  }

  private forgetHandles(): void {
    this.lastCubic = null;
    this.lastQuadratic = null;
  }

  private closePath(): void {
    this.endContour(true);
    this.here = this.start;
    this.forgetHandles();
  }

  private endContour(byZ: boolean): void {
    const { segments, start } = this;
    this.segments = [];
    this.open = false;
    if (segments.length === 0) return;
    const gap = distance(this.here, start);
    const closed = byZ || (gap <= SAME_POINT && isRound(segments));
    if (closed && gap > SAME_POINT) segments.push({ kind: 'line', to: start });
    else if (closed && gap > 0)
      segments[segments.length - 1] = { ...segments[segments.length - 1]!, to: start };
    this.contours.push({ start, segments, closed });
  }
}

/** A line there and straight back is no closed contour. */
function isRound(segments: readonly Segment[]): boolean {
  return segments.length > 2 || segments.some(({ kind }) => kind !== 'line');
}
