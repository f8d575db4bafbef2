import type { Move } from './move';

/**
 * What one cut does with one cutter, in order, in the view of its face. A cut that needs two cutters gives two of
 * these. Moves begin and end at the clearance height; the first is a rapid that gets there.
 */
export interface CutMoves {
  readonly cut: string;
  readonly cutter: string;
  readonly face: 'A' | 'B';
  readonly moves: readonly Move[];
}
