import { BOARD, woodAt, type Wood } from './rail-model';

const STEP = 0.5;

interface Sample {
  readonly x: number;
  readonly wood: Wood;
}

/** A piece of wood that the section line meets. */
export interface SectionPiece {
  /** Its corners: x, and the height above face B. */
  readonly points: readonly (readonly [x: number, height: number])[];
  readonly isTab: boolean;
  /** The least height of wood in it, mm. */
  readonly least: number;
}

/** The section through the rail along the line y = `at`, both in mm. */
export function railSection(at: number): SectionPiece[] {
  const pieces: SectionPiece[] = [];
  let run: Sample[] = [];
  const endRun = () => {
    if (run.length > 1) pieces.push(pieceOf(run));
    run = [];
  };
  for (let x = 0; x <= BOARD.x; x += STEP) {
    const wood = woodAt(x, at);
    const last = run[run.length - 1];
    if (!wood || (last && last.wood.isTab !== wood.isTab)) endRun();
    if (wood) run.push({ x, wood });
  }
  endRun();
  return pieces;
}

function pieceOf(run: readonly Sample[]): SectionPiece {
  const top = run.map(({ x, wood }) => [x, wood.top] as const);
  const bottom = run.map(({ x, wood }) => [x, wood.bottom] as const).reverse();
  return {
    points: [...withoutStraights(top), ...withoutStraights(bottom)],
    isTab: run[0]?.wood.isTab ?? false,
    least: Math.min(...run.map(({ wood }) => wood.top - wood.bottom)),
  };
}

/** Leaves out points between two neighbours of the same height. */
function withoutStraights(points: readonly (readonly [number, number])[]) {
  return points.filter(([, h], i) => points[i - 1]?.[1] !== h || points[i + 1]?.[1] !== h);
}
