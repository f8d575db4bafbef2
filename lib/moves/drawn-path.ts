import type { CutMoves } from './cut-moves';
import type { ArcMove, Position } from './move';

/** A cut's moves as lines to draw, in the view of its face, mm: runs of x, y pairs in one array each. */
export interface DrawnPath {
  readonly cut: string;
  readonly cutter: string;
  readonly face: 'A' | 'B';
  /** Feeds: each run is a polyline. */
  readonly feeds: readonly Float32Array[];
  /** Rapids over the work, one polyline each. */
  readonly rapids: readonly Float32Array[];
  /** Where the cutter goes down into the wood. */
  readonly entries: Float32Array;
}

/** Chords of drawn arcs lie this near to them, mm: finer than a pixel at any zoom people plan at. */
const DRAWN_TOLERANCE = 0.02;

/** Flattens what one cut does into lines to draw. */
export function drawnPath({ cut, cutter, face, moves }: CutMoves): DrawnPath {
  const feeds: number[][] = [];
  const rapids: number[][] = [];
  const entries: number[] = [];
  let at: Position | null = null;
  let last: 'feed' | 'rapid' | null = null;
  const runOf = (kind: 'feed' | 'rapid', from: Position): number[] => {
    const runs = kind === 'feed' ? feeds : rapids;
    const current = runs.at(-1);
    if (last === kind && current) return current;
    last = kind;
    const run = [from.x, from.y];
    runs.push(run);
    return run;
  };
  for (const move of moves) {
    if (move.kind === 'dwell') continue;
    const { to }: { to: Position } = move;
    if (at) {
      const run = runOf(move.kind === 'rapid' ? 'rapid' : 'feed', at);
      if (move.kind === 'feed' && to.z < at.z && at.z > 0) entries.push(at.x, at.y);
      if (move.kind === 'arc') pushArc(run, at, move);
      else run.push(to.x, to.y);
    }
    at = to;
  }
  const isSeen = (run: readonly number[]): boolean => run.some((value, i) => i > 1 && value !== run[i % 2]);
  const packed = (runs: number[][]): Float32Array[] =>
    runs.filter(isSeen).map((run) => Float32Array.from(run));
  return {
    cut,
    cutter,
    face,
    feeds: packed(feeds),
    rapids: packed(rapids),
    entries: Float32Array.from(entries),
  };
}

function pushArc(run: number[], from: Position, { to, cx, cy, ccw }: ArcMove): void {
  const radius = Math.hypot(from.x - cx, from.y - cy);
  const start = Math.atan2(from.y - cy, from.x - cx);
  let sweep = Math.atan2(to.y - cy, to.x - cx) - start;
  if (ccw && sweep <= 1e-9) sweep += 2 * Math.PI;
  if (!ccw && sweep >= -1e-9) sweep -= 2 * Math.PI;
  const step = radius > DRAWN_TOLERANCE ? 2 * Math.acos(1 - DRAWN_TOLERANCE / radius) : Math.PI / 4;
  const count = Math.max(1, Math.ceil(Math.abs(sweep) / step));
  for (let i = 1; i < count; i++) {
    const angle = start + (sweep * i) / count;
    run.push(cx + radius * Math.cos(angle), cy + radius * Math.sin(angle));
  }
  run.push(to.x, to.y);
}
