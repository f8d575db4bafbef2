import type { ArcMove, Move, Position } from '@/lib/moves/move';
import { arcPoints, splitArc, type StepPoint } from './arc-steps';
import { coordinateWord, fromSteps, plainWord, toSteps, type NumberFormat } from './number-word';

export interface MotionOptions {
  readonly format: NumberFormat;
  /** Where the program's zero stands in the moves' coordinates, mm. */
  readonly zero: Position;
  readonly arcs: boolean;
}

/** Turns moves into lines, and remembers where the machine is in steps of the last decimal. */
export interface MotionWriter {
  write(move: Move): void;
  /** Straight up or down, alone on its line. */
  rapidZ(z: number): void;
  /** After a stop or a cutter change nothing is taken for granted: the next lines say place and feed again. */
  forget(): void;
}

/** Radii at both ends of an arc may differ by this, in program units: 0.002 mm and 0.0002 in (NIST RS274NGC 3.5.3.2). */
const RADIUS_LIMIT = { mm: 0.002, inch: 0.0002 } as const;
/** Chords of arcs that leave as lines lie this near to them, mm. */
const CHORD_TOLERANCE = 0.0025;

export function createMotionWriter(options: MotionOptions, push: (line: string) => void): MotionWriter {
  const { format, zero } = options;
  let at: { x: number | null; y: number | null; z: number | null } = { x: null, y: null, z: null };
  let feed: string | null = null;

  const steps = (p: Position): StepPoint & { z: number } => ({
    x: toSteps(p.x - zero.x, format),
    y: toSteps(p.y - zero.y, format),
    z: toSteps(p.z - zero.z, format),
  });

  function straight(word: 'G0' | 'G1', to: { x?: number; y?: number; z?: number }, rate?: number): void {
    const words = (['x', 'y', 'z'] as const).flatMap((axis) => {
      const value = to[axis];
      return value === undefined || value === at[axis]
        ? []
        : [coordinateWord(axis.toUpperCase(), value, format)];
    });
    if (words.length === 0) return;
    push([word, ...words, ...feedWords(rate)].join(' '));
    at = { ...at, ...to };
  }

  function feedWords(rate: number | undefined): string[] {
    if (rate === undefined) return [];
    const word = plainWord('F', rate / format.unit, format.unit === 1 ? 1 : 3);
    if (word === feed) return [];
    feed = word;
    return [word];
  }

  /** Up first, then across, then down: some controllers move axes one after another. */
  function rapid(to: Position): void {
    const { x, y, z } = steps(to);
    if (at.z !== null && z > at.z) straight('G0', { z });
    straight('G0', { x, y });
    straight('G0', { z });
  }

  function arc(move: ArcMove): void {
    const from = here();
    const target = steps(move.to);
    const center = { x: (move.cx - zero.x) / format.unit, y: (move.cy - zero.y) / format.unit };
    const scale = 10 ** format.decimals;
    const pieces = options.arcs
      ? splitArc(from, target, { x: center.x * scale, y: center.y * scale }, move.ccw)
      : null;
    const limit = (format.unit === 1 ? RADIUS_LIMIT.mm : RADIUS_LIMIT.inch) * scale;
    if (!pieces || pieces.some((piece) => piece.mismatch > limit)) return chords(move, from, target);
    const zStart = from.z;
    pieces.forEach((piece, i) => {
      const z = i === pieces.length - 1 ? target.z : Math.round(zStart + (target.z - zStart) * piece.share);
      const now = here();
      // A tiny arc whose ends fall together would be read as a full circle.
      if (piece.to.x === now.x && piece.to.y === now.y) return straight('G1', { z }, move.feed);
      const words = [
        move.ccw ? 'G3' : 'G2',
        coordinateWord('X', piece.to.x, format),
        coordinateWord('Y', piece.to.y, format),
        ...(z === now.z ? [] : [coordinateWord('Z', z, format)]),
        coordinateWord('I', piece.center.x - now.x, format),
        coordinateWord('J', piece.center.y - now.y, format),
        ...feedWords(move.feed),
      ];
      push(words.join(' '));
      at = { x: piece.to.x, y: piece.to.y, z };
    });
  }

  function chords(move: ArcMove, from: StepPoint & { z: number }, target: StepPoint & { z: number }): void {
    const start = { x: fromSteps(from.x, format) + zero.x, y: fromSteps(from.y, format) + zero.y };
    const points = arcPoints(start, move, CHORD_TOLERANCE);
    points.forEach((point, i) => {
      const isLast = i === points.length - 1;
      const z = isLast ? target.z : Math.round(from.z + ((target.z - from.z) * (i + 1)) / points.length);
      const place = isLast ? target : steps({ ...point, z: 0 });
      straight('G1', { x: place.x, y: place.y, z }, move.feed);
    });
  }

  function here(): StepPoint & { z: number } {
    const { x, y, z } = at;
    if (x === null || y === null || z === null) throw new Error('A program must travel to its first place');
    return { x, y, z };
  }

  return {
    write(move) {
      switch (move.kind) {
        case 'rapid':
          return rapid(move.to);
        case 'feed':
          return straight('G1', steps(move.to), move.feed);
        case 'arc':
          return arc(move);
        case 'dwell':
          return push(`G4 ${plainWord('P', move.seconds, 3)}`);
      }
    },
    rapidZ: (z) => straight('G0', { z: toSteps(z - zero.z, format) }),
    forget() {
      feed = null;
      at = { x: null, y: null, z: null };
    },
  };
}
