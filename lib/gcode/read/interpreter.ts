import { checkBlock, type Block } from './check-block';
import { drillCycle } from './drill-cycle';
import { initialState, type MachineState } from './machine-state';
import type { Profile } from './profile';
import { ProgramError } from './program-error';
import type { MotionEvent, ProgramEvent, ProgramPoint } from './program-event';
import { resolveArc } from './resolve-arc';
import { scanLine } from './scan-line';

/** Radii at both ends of an arc may differ by 0.002 mm or 0.0002 in (NIST RS274NGC 3.5.3.2). */
const RADIUS_LIMIT_MM = 0.002;
const RADIUS_LIMIT_INCH = 0.0002;
/** Binary rounding of a limit that decimals meet exactly. */
const SLACK = 1e-9;
const AXES = ['X', 'Y', 'Z'] as const;

/**
 * Executes lines one after another in the order of NIST RS274NGC, table 8, and tells what happens. Throws
 * {@link ProgramError} at the first thing that a controller would refuse or that cannot be known.
 */
export class Interpreter {
  private readonly state: MachineState = initialState();
  private ended = false;
  private percents = 0;
  private line = 0;

  constructor(private readonly profile: Profile) {}

  /** Whether M2, M30 or a second % was met: what follows is not read. */
  get isEnded(): boolean {
    return this.ended;
  }

  /** The events of the next line. */
  read(text: string): ProgramEvent[] {
    this.line++;
    if (this.ended) return [];
    const scanned = scanLine(text, this.line);
    if (scanned.percent) return this.percent();
    this.checkLength(text);
    const events: ProgramEvent[] = scanned.comments.map((comment) => ({
      kind: 'comment',
      text: comment,
      line: this.line,
    }));
    const block = checkBlock(scanned, this.line, this.profile);
    if (block.codes.size > 0 || block.values.size > 0) this.execute(new Used(block), events);
    return events;
  }

  private percent(): ProgramEvent[] {
    if (!this.profile.percent) throw new ProgramError(this.line, 1, '% is not known to this controller.');
    this.percents++;
    if (this.percents > 1) this.ended = true;
    return [];
  }

  private checkLength(text: string): void {
    const { lineLength } = this.profile;
    if (lineLength === null || text.length <= lineLength) return;
    const bare = text.replace(/\([^)]*\)|;.*|[ \t]/g, '');
    if (bare.length > lineLength)
      throw new ProgramError(this.line, lineLength + 1, `The line holds more than ${lineLength} characters.`);
  }

  private execute(block: Used, events: ProgramEvent[]): void {
    this.setFeed(block);
    this.setSpindle(block, events);
    this.setModes(block);
    this.dwell(block, events);
    this.move(block, events);
    block.value('O');
    block.refuseUnused();
    this.stop(block, events);
  }

  /** F, S, T in that order; a feed said together with a change of units would be ambiguous. */
  private setFeed(block: Used): void {
    const feed = block.value('F');
    if (!feed) return;
    const units = block.code('units');
    const changes = units !== null && this.state.unitSaid && unitOf(units) !== this.state.unit;
    if (changes) block.raise(feed.column, 'F stands on the line that changes the units: say it after.');
    if (feed.value <= 0) block.raise(feed.column, 'F must be above 0.');
    this.state.feed = feed.value * (units === null ? this.state.unit : unitOf(units));
  }

  private setSpindle(block: Used, events: ProgramEvent[]): void {
    const { state, line } = this;
    const speed = block.value('S');
    if (speed && speed.value < 0) block.raise(speed.column, 'S must not be negative.');
    if (speed) state.rpm = speed.value;
    const tool = block.value('T');
    if (tool && (!Number.isInteger(tool.value) || tool.value < 0))
      block.raise(tool.column, 'T needs a whole number.');
    if (tool) state.tool = tool.value;
    if (block.code('tool change') !== null) {
      if (state.tool === null) block.raise(1, 'M6 without a T before it: which tool?');
      state.spindle = 'off';
      events.push({ kind: 'tool', tool: state.tool ?? 0, line });
    }
    const turn = block.code('spindle');
    if (turn !== null) state.spindle = turn === 5 ? 'off' : turn === 3 ? 'clockwise' : 'counter-clockwise';
    if (turn !== null || (speed && state.spindle !== 'off')) {
      const rpm = state.spindle === 'off' ? 0 : state.rpm;
      events.push({ kind: 'spindle', rpm, clockwise: state.spindle !== 'counter-clockwise', line });
    }
  }

  private setModes(block: Used): void {
    const { state } = this;
    const units = block.code('units');
    if (units !== null) {
      const unit = unitOf(units);
      // A feed said in the other unit is not this many of the new one.
      if (state.unitSaid && unit !== state.unit) state.feed = null;
      state.unit = unit;
      state.unitSaid = true;
    }
    if (block.code('length offset') === 43) block.value('H');
    if (block.code('path control') === 64) block.value('P');
    const distance = block.code('distance');
    if (distance !== null) state.absolute = distance === 90;
    const centres = block.code('arc distance');
    if (centres !== null) state.absoluteCentres = centres === 90.1;
    const level = block.code('return level');
    if (level !== null) state.cycle.returnsToInitial = level === 98;
  }

  private dwell(block: Used, events: ProgramEvent[]): void {
    if (block.code('non-modal') !== 4) return;
    const time = block.value('P');
    if (!time) block.raise(1, 'G4 needs P, the seconds to wait.');
    else if (time.value < 0) block.raise(time.column, 'G4 cannot wait for less than no time.');
    else events.push({ kind: 'dwell', seconds: time.value, line: this.line });
  }

  private move(block: Used, events: ProgramEvent[]): void {
    const { state } = this;
    const said = block.code('motion');
    if (said !== null) {
      if (said !== state.motion) state.cycle = { ...state.cycle, z: null, r: null, q: null };
      state.motion = said === 80 ? null : said;
    }
    const hasAxes = AXES.some((axis) => block.has(axis));
    if (said === 80) {
      if (hasAxes) block.raise(1, 'G80 moves nothing: its line must not name an axis.');
      return;
    }
    if (!hasAxes) {
      if (said !== null && said > 1) block.raise(1, `G${said} needs to know where to go.`);
      return;
    }
    if (state.motion === null) block.raise(1, 'An axis is named while no motion is in force.');
    if (state.motion === 81 || state.motion === 83) return void events.push(...this.cycle(block));
    const to = this.target(block);
    const event = this.motionEvent(block, to);
    if (event) events.push(event);
    state.x = to.x;
    state.y = to.y;
    state.z = to.z;
  }

  /** Where the line goes; axes that nobody has named yet stay unknown. */
  private target(block: Used): { x: number | null; y: number | null; z: number | null } {
    const along = (axis: 'X' | 'Y' | 'Z', now: number | null): number | null => {
      const word = block.value(axis);
      if (!word) return now;
      const length = word.value * this.state.unit;
      if (this.state.absolute) return length;
      if (now === null)
        return block.raise(word.column, `${axis} is told relative to a place that is not known.`);
      return now + length;
    };
    const { x, y, z } = this.state;
    return { x: along('X', x), y: along('Y', y), z: along('Z', z) };
  }

  private motionEvent(
    block: Used,
    target: { x: number | null; y: number | null; z: number | null },
  ): MotionEvent | null {
    const { state, line } = this;
    const to = known(target);
    const from = known(state);
    if (state.motion === 0) return to ? { kind: 'rapid', from, to, line } : null;
    if (!to || !from)
      return block.raise(1, 'This feeds from a place that is not known: name X, Y and Z with a rapid first.');
    const feed = this.feed(block);
    switch (state.motion) {
      case 1:
        return { kind: 'feed', from, to, feed, line };
      case 38.2:
        if (from.x === to.x && from.y === to.y && from.z === to.z) block.raise(1, 'G38.2 goes nowhere.');
        return { kind: 'probe', from, to, feed, line };
      default:
        return this.arc(block, from, to, feed);
    }
  }

  private arc(block: Used, from: ProgramPoint, to: ProgramPoint, feed: number): MotionEvent {
    const { state, line } = this;
    if (!block.has('X') && !block.has('Y')) block.raise(1, 'An arc needs X or Y, a full circle too.');
    const radius = block.value('R');
    const i = block.value('I');
    const j = block.value('J');
    const turns = block.value('P');
    const k = block.value('K');
    if (k) block.raise(k.column, 'K belongs to another plane than XY.');
    if (radius && (i ?? j)) block.raise(radius.column, 'An arc is told by R or by I and J, not by both.');
    if (!radius && !i && !j) block.raise(1, 'An arc needs its centre (I and J) or its radius (R).');
    if (turns && (!Number.isInteger(turns.value) || turns.value < 1))
      block.raise(turns.column, 'P needs whole turns.');
    const base = state.absoluteCentres ? { x: 0, y: 0 } : from;
    if (state.absoluteCentres && !radius && !(i && j))
      block.raise(1, 'Absolute centres (G90.1) need both I and J.');
    const resolved = resolveArc({
      from,
      to,
      ccw: state.motion === 3,
      turns: turns?.value ?? 1,
      radiusLimit: (state.unit === 1 ? RADIUS_LIMIT_MM : RADIUS_LIMIT_INCH * 25.4) + SLACK,
      by: radius
        ? { kind: 'radius', radius: radius.value * state.unit }
        : {
            kind: 'center',
            center: { x: base.x + (i?.value ?? 0) * state.unit, y: base.y + (j?.value ?? 0) * state.unit },
          },
    });
    if (typeof resolved === 'string')
      return block.raise(radius?.column ?? i?.column ?? j?.column ?? 1, resolved);
    return { kind: 'arc', from, to, ...resolved, feed, line };
  }

  /** One hole a line; Z, R and Q stay in force from line to line. */
  private cycle(block: Used): MotionEvent[] {
    const { state, line } = this;
    const from = known(state);
    if (!from) return block.raise(1, 'A drilling cycle begins from a place that is not known.');
    const unit = state.unit;
    const { cycle } = state;
    const r = block.value('R');
    const q = block.value('Q');
    const z = block.value('Z');
    if (r) cycle.r = r.value * unit + (state.absolute ? 0 : from.z);
    if (q) cycle.q = q.value * unit;
    if (z) cycle.z = z.value * unit + (state.absolute ? 0 : (cycle.r ?? from.z));
    if (cycle.z === null || cycle.r === null) return block.raise(1, `G${state.motion ?? 81} needs Z and R.`);
    if (state.motion === 83 && !(cycle.q !== null && cycle.q > 0))
      return block.raise(q?.column ?? 1, 'G83 needs Q, the depth of a peck, above 0.');
    if (cycle.r < cycle.z) return block.raise(r?.column ?? 1, 'R lies below the bottom of the hole.');
    const to = this.target(block);
    const events = drillCycle({
      from,
      x: to.x ?? from.x,
      y: to.y ?? from.y,
      z: cycle.z,
      r: cycle.r,
      peck: state.motion === 83 ? (cycle.q ?? 0) : 0,
      returnsToInitial: cycle.returnsToInitial,
      feed: this.feed(block),
      line,
    });
    const last = events.at(-1);
    if (last) ({ x: state.x, y: state.y, z: state.z } = last.to);
    return events;
  }

  private feed(block: Used): number {
    return this.state.feed ?? block.raise(1, 'No feed (F) is in force.');
  }

  private stop(block: Used, events: ProgramEvent[]): void {
    const stop = block.code('stop');
    if (stop === null) return;
    const { line } = this;
    if (stop === 0 || stop === 1) events.push({ kind: 'stop', optional: stop === 1, line });
    else {
      this.ended = true;
      events.push({ kind: 'end', line });
    }
  }
}

/** A block from which words are taken; what nobody took is an error, not a silence. */
class Used {
  private readonly taken = new Set<string>();

  constructor(private readonly block: Block) {}

  code(group: Parameters<Block['codes']['get']>[0]): number | null {
    return this.block.codes.get(group)?.number ?? null;
  }

  has(letter: string): boolean {
    return this.block.values.has(letter);
  }

  value(letter: string): { value: number; column: number } | undefined {
    this.taken.add(letter);
    return this.block.values.get(letter);
  }

  refuseUnused(): void {
    for (const [letter, { column }] of this.block.values)
      if (!this.taken.has(letter)) this.raise(column, `Nothing on this line uses ${letter}.`);
  }

  raise(column: number, sentence: string): never {
    throw new ProgramError(this.block.line, column, sentence);
  }
}

function unitOf(code: number): 1 | 25.4 {
  return code === 20 ? 25.4 : 1;
}

function known({ x, y, z }: { x: number | null; y: number | null; z: number | null }): ProgramPoint | null {
  return x === null || y === null || z === null ? null : { x, y, z };
}
