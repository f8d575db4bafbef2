import type { Corner } from './board-schema';
import type { TurnAxis } from './job-schema';

interface Point {
  readonly x: number;
  readonly y: number;
}

/**
 * Where a point of one face's view stands in the other's, after turning the board about `axis`: `x` keeps x and turns
 * y over, `y` keeps y and turns x over. Its own inverse.
 */
export function turnPoint(
  board: { readonly x: number; readonly y: number },
  axis: TurnAxis,
  { x, y }: Point,
): Point {
  return axis === 'x' ? { x, y: board.y - y } : { x: board.x - x, y };
}

/** The corner of the other face's view that is the same physical corner of the board. */
export function turnCorner(axis: TurnAxis, corner: Corner): Corner {
  if (corner === 'center') return corner;
  const [depth, side] = corner.split('-') as ['front' | 'back', 'left' | 'right'];
  return axis === 'x'
    ? `${depth === 'front' ? 'back' : 'front'}-${side}`
    : `${depth}-${side === 'left' ? 'right' : 'left'}`;
}
