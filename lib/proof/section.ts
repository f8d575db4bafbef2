import { simplifyPolyline } from '@/lib/geometry/simplify';
import type { Vec } from '@/lib/geometry/vec';
import type { FaceName } from '@/lib/report/report';
import { modelPoint, type BoardModel } from './board-model';
import { cellAt } from './height-field';

/** The board cut along a line, as data. x = length along the line, y = height above the far face of `face`, mm. */
export interface Section {
  /** In whose view the line was given; that face is up. */
  readonly face: FaceName;
  readonly length: number;
  readonly thickness: number;
  /** Outlines of the wood, each a closed ring, first point not repeated. */
  readonly wood: readonly (readonly Vec[])[];
}

/** Thinner wood than this is no wood, mm: what rounding leaves of a cut-through floor. */
const NO_WOOD = 1e-3;
/** Most places that are looked at: more than a screen has. */
const MOST_SAMPLES = 8000;
/** Points nearer to a straight run than this are left out, mm. */
const STRAIGHT = 2e-3;

interface Sample {
  readonly s: number;
  readonly low: number;
  readonly high: number;
}

/** Section of the board along a line between two points of `face`'s view; what lies beyond the board has no wood. */
export function sectionAlong(model: BoardModel, from: Vec, to: Vec, face: FaceName = 'A'): Section {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const step = Math.min(model.fields.A.stepX, model.fields.A.stepY) / 2;
  const count = Math.max(1, Math.min(MOST_SAMPLES, Math.ceil(length / step)));
  const runs: Sample[][] = [];
  let run: Sample[] = [];
  for (let i = 0; i <= count; i++) {
    const share = i / count;
    const p = { x: from.x + (to.x - from.x) * share, y: from.y + (to.y - from.y) * share };
    const wood = woodAt(model, modelPoint(model, face, p), face);
    if (wood) run.push({ s: length * share, ...wood });
    else if (run.length > 0) {
      runs.push(run);
      run = [];
    }
  }
  if (run.length > 0) runs.push(run);
  return { face, length, thickness: model.board.z, wood: runs.filter((r) => r.length > 1).map(outlineOf) };
}

function woodAt(model: BoardModel, p: Vec, face: FaceName): { low: number; high: number } | null {
  const { board, fields } = model;
  if (p.x < 0 || p.y < 0 || p.x > board.x || p.y > board.y) return null;
  const cell = cellAt(fields.A, p.x, p.y);
  const up = fields[face].z[cell]!;
  const down = fields[face === 'A' ? 'B' : 'A'].z[cell]!;
  const high = board.z + up;
  return high + down > NO_WOOD ? { low: -down, high } : null;
}

function outlineOf(samples: readonly Sample[]): Vec[] {
  const bottom = simplifyPolyline(
    samples.map(({ s, low }) => ({ x: s, y: low })),
    STRAIGHT,
  );
  const top = simplifyPolyline(
    samples.map(({ s, high }) => ({ x: s, y: high })),
    STRAIGHT,
  );
  return [...bottom, ...[...top].reverse()];
}
