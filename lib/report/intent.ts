import type { FaceName } from './report';

/**
 * What the proof must know of the plan, as plain data: it may not import the planner, or it would prove the plan with
 * the plan. Coordinates are in the view of the cut's face, mm.
 */
export interface ProgramIntent {
  readonly file: string;
  readonly face: FaceName;
  readonly cutters: readonly string[];
  readonly cuts: readonly string[];
  readonly text: string;
  /**
   * Which cut and cutter each line works for: entry i holds from its `line` (1-based) until the next entry. `cut` is
   * null for the program's own head and tail.
   */
  readonly lineMap: readonly LineMapEntry[];
}

export interface LineMapEntry {
  readonly line: number;
  readonly cut: string | null;
  readonly cutter: string | null;
}

/** Where a tab was put and how the cutter is lifted over it. */
export interface TabPlace {
  readonly cut: string;
  readonly outline: string;
  readonly contour: number;
  readonly fraction: number;
  /** Middle of the tab on the outline. */
  readonly at: readonly [number, number];
  /** Unit vector of the cutter's travel at the tab. */
  readonly along: readonly [number, number];
  /** Middle of the tab on the cutter's centre line. */
  readonly center: readonly [number, number];
  /** Length of the wood at its top, mm. */
  readonly length: number;
  /** Height of its top above the far face, mm. */
  readonly height: number;
  /** Wood asked for under the top, mm. */
  readonly hold: number;
  /** Slope of the ends, degrees. */
  readonly slope: number;
  /** What the far face's cuts were taken to take away under it, mm; explains an automatic height. */
  readonly farDepth: number;
  readonly auto: boolean;
}
