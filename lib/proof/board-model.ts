import type { Job } from '@/lib/job/job-schema';
import { turnPoint } from '@/lib/job/turn';
import type { TurnAxis } from '@/lib/job/job-schema';
import type { FaceName } from '@/lib/report/report';
import { createHeightField, type HeightField } from './height-field';

/**
 * The board as the programs leave it: a height field for each face. Both fields lie in face A's view, so that one index
 * is one physical place; face B's heights are depths from its own face, looked at through the turn.
 */
export interface BoardModel {
  readonly board: { readonly x: number; readonly y: number; readonly z: number };
  readonly axis: TurnAxis;
  readonly fields: Readonly<Record<FaceName, HeightField>>;
}

/** Finest cells, mm. */
const FINEST = 0.1;
/** Most cells of a face: bounds memory to 32 MB a face, and the time of a pass over it. */
const MOST_CELLS = 8e6;
/** Cell widths to choose from: drawn sizes are mostly whole multiples of these, so edges fall between cells. */
const STEPS = [0.1, 0.2, 0.25, 0.5, 1, 2, 5, 10, 20, 50];

/** An uncut board at the resolution its size allows. */
export function createBoardModel({ board, turn }: Pick<Job, 'board' | 'turn'>, step?: number): BoardModel {
  const box = { x: 0, y: 0, width: board.x, height: board.y };
  const width = step ?? boardStep(board);
  return {
    board: { x: board.x, y: board.y, z: board.z },
    axis: turn.axis,
    fields: { A: createHeightField(box, width), B: createHeightField(box, width) },
  };
}

/** Width of the model's cells for a board of this size, mm. */
export function boardStep({ x, y }: { readonly x: number; readonly y: number }): number {
  const least = Math.max(FINEST, Math.sqrt((x * y) / MOST_CELLS));
  return STEPS.find((step) => step >= least - 1e-9) ?? least;
}

/** A place of one face's view in the model's own coordinates, which are A's view; and back. */
export function modelPoint(
  { board, axis }: Pick<BoardModel, 'board' | 'axis'>,
  face: FaceName,
  p: { readonly x: number; readonly y: number },
): { x: number; y: number } {
  return face === 'A' ? { x: p.x, y: p.y } : turnPoint(board, axis, p);
}

/** Thickness of the wood left in a cell, mm; 0 where nothing is. */
export function thicknessAt({ board, fields }: BoardModel, cell: number): number {
  return Math.max(0, board.z + fields.A.z[cell]! + fields.B.z[cell]!);
}
