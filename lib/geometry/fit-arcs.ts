import { distance, type Vec } from './vec';

/** A straight run to `to`. */
export interface LinePathPiece {
  readonly kind: 'line';
  readonly to: Vec;
}

/** A circular run to `to` about `center`, less than a full turn. */
export interface ArcPathPiece {
  readonly kind: 'arc';
  readonly to: Vec;
  readonly center: Vec;
  readonly ccw: boolean;
}

export type PathPiece = LinePathPiece | ArcPathPiece;

export interface FitOptions {
  /** The last point is joined to the first. */
  readonly closed: boolean;
  /** Greatest distance of the pieces from the given points and chords, mm. */
  readonly tolerance: number;
}

/** Larger radii leave as lines: their centre would lose its digits. */
const LARGEST_RADIUS = 5000;
/** A half turn at most: at 180° ends and centre still fix an arc, beyond it rounding moves the centre far. */
const WIDEST = Math.PI * 0.95;
/** Arcs that stand for fewer edges than this are lines just as well. */
const FEWEST_EDGES = 3;

/**
 * Lines and arcs along a polyline, each ending at one of its points. Greedy: the longest arc from each point, by
 * doubling and then halving; an arc must pass within the tolerance of its points and of the middles of its chords, and
 * turn one way. Runs that no arc fits stay lines.
 */
export function fitArcs(points: readonly Vec[], { closed, tolerance }: FitOptions): PathPiece[] {
  const [first] = points;
  if (!first || points.length < 2) return [];
  const line = closed ? [...points, first] : points;
  const pieces: PathPiece[] = [];
  let at = 0;
  while (at < line.length - 1) {
    const arc = longestArc(line, at, tolerance);
    if (arc) {
      pieces.push(arc.piece);
      at = arc.end;
    } else {
      at++;
      pieces.push({ kind: 'line', to: line[at]! });
    }
  }
  return pieces;
}

function longestArc(
  line: readonly Vec[],
  from: number,
  tolerance: number,
): { piece: ArcPathPiece; end: number } | null {
  const last = line.length - 1;
  let good: { piece: ArcPathPiece; end: number } | null = null;
  let span = FEWEST_EDGES;
  let tooFar = last + 1;
  while (from + span <= last) {
    const piece = arcThrough(line, from, from + span, tolerance);
    if (!piece) {
      tooFar = from + span;
      break;
    }
    good = { piece, end: from + span };
    span *= 2;
  }
  if (!good) return null;
  let low = good.end;
  let high = Math.min(tooFar, last + 1);
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    const piece = arcThrough(line, from, middle, tolerance);
    if (piece) {
      good = { piece, end: middle };
      low = middle;
    } else high = middle;
  }
  return good;
}

/** The arc from one point to another that lies best among those between, or null where none is near enough. */
function arcThrough(line: readonly Vec[], from: number, to: number, tolerance: number): ArcPathPiece | null {
  const a = line[from]!;
  const b = line[to]!;
  const chord = distance(a, b);
  if (chord < 1e-6) return null;
  const bulge = fittedBulge(line, from, to, a, b, chord);
  if (bulge === null || Math.abs(bulge) < 1e-7) return null;
  // h = sagitta over half chord = tan(sweep / 4); positive: the arc bulges to the left, so it runs clockwise.
  const sweep = 4 * Math.atan(Math.abs(bulge));
  if (sweep > WIDEST) return null;
  const radius = (chord * (1 + bulge * bulge)) / (4 * Math.abs(bulge));
  if (radius > LARGEST_RADIUS) return null;
  const offset = (chord / 2) * ((1 - bulge * bulge) / (2 * bulge));
  const ux = (b.x - a.x) / chord;
  const uy = (b.y - a.y) / chord;
  const center = { x: (a.x + b.x) / 2 + uy * offset, y: (a.y + b.y) / 2 - ux * offset };
  const ccw = bulge < 0;
  return followsPoints(line, from, to, center, radius, ccw, tolerance)
    ? { kind: 'arc', to: b, center, ccw }
    : null;
}

/**
 * Bulge (sagitta over half chord, positive to the left) that fits the points between best: each gives one from where it
 * stands in the chord's frame, weighed by how well it can tell.
 */
function fittedBulge(
  line: readonly Vec[],
  from: number,
  to: number,
  a: Vec,
  b: Vec,
  chord: number,
): number | null {
  const ux = (b.x - a.x) / chord;
  const uy = (b.y - a.y) / chord;
  const half = chord / 2;
  let sum = 0;
  let weights = 0;
  for (let i = from + 1; i < to; i++) {
    const p = line[i]!;
    const dx = p.x - a.x;
    const dy = p.y - a.y;
    const along = dx * ux + dy * uy - half;
    const up = -dx * uy + dy * ux;
    if (Math.abs(up) < 1e-12) continue;
    // Circle through (−half, 0), (half, 0) and (along, up): k = (half² − along² − up²) / (2·up) is minus the centre's height.
    const k = (half * half - along * along - up * up) / (2 * up);
    // Sagitta h on the side of `up` solves (half² − h²) / (2h) = k.
    const h = Math.sign(up) * (Math.sqrt(k * k + half * half) - Math.sign(up) * k);
    const weight = up * up;
    sum += (h / half) * weight;
    weights += weight;
  }
  return weights > 0 ? sum / weights : null;
}

/** Whether every point and every chord's middle lies near the circle, and the points run round it one way. */
function followsPoints(
  line: readonly Vec[],
  from: number,
  to: number,
  center: Vec,
  radius: number,
  ccw: boolean,
  tolerance: number,
): boolean {
  for (let i = from; i < to; i++) {
    const p = line[i]!;
    const q = line[i + 1]!;
    const turn = (p.x - center.x) * (q.y - center.y) - (p.y - center.y) * (q.x - center.x);
    if (ccw ? turn <= 0 : turn >= 0) return false;
    if (Math.abs(distance(q, center) - radius) > tolerance) return false;
    const middle = { x: (p.x + q.x) / 2, y: (p.y + q.y) / 2 };
    if (Math.abs(distance(middle, center) - radius) > tolerance) return false;
  }
  return true;
}
