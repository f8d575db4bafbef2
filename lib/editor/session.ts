import type { Vec } from '@/lib/geometry/vec';
import type { Face } from '@/lib/job/numbers';
import type { ToolId } from './tools/tool';

/** What one person at one screen looks at and has in hand; never saved with the document, never undone. */
export interface Session {
  /** The face that is seen from above. */
  readonly face: Face;
  readonly tool: ToolId;
  readonly selection: Selection;
  /** The line along which the section is drawn, in the view of `face`. */
  readonly section: SectionLine;
  readonly show: Shown;
}

/** Outlines that are selected, and the cut that the inspector is about. */
export interface Selection {
  readonly outlines: readonly string[];
  readonly cut: string | null;
}

export interface SectionLine {
  readonly from: Vec;
  readonly to: Vec;
}

/** What is drawn over the board. */
export interface Shown {
  readonly paths: boolean;
  readonly rapids: boolean;
  readonly grid: boolean;
  readonly farFace: boolean;
}

export const NOTHING_SELECTED: Selection = { outlines: [], cut: null };

/** A session on a board that was just opened: its first face up, the section along the middle of its length. */
export function startSession(board: { x: number; y: number }, face: Face): Session {
  return {
    face,
    tool: 'select',
    selection: NOTHING_SELECTED,
    section: middleSection(board),
    show: { paths: true, rapids: false, grid: true, farFace: true },
  };
}

/** Through the middle of the board, along its longer side. */
export function middleSection({ x, y }: { x: number; y: number }): SectionLine {
  return x >= y
    ? { from: { x: 0, y: y / 2 }, to: { x, y: y / 2 } }
    : { from: { x: x / 2, y: 0 }, to: { x: x / 2, y } };
}
