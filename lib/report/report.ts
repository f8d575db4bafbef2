import type { FindingCode, Severity } from './finding-codes';

export type FaceName = 'A' | 'B';

/** One thing the engine noticed, with its place in the view of `face`. */
export interface Finding {
  readonly severity: Severity;
  readonly code: FindingCode;
  /** Id of the cut it is about, where it is about one. */
  readonly cut?: string;
  readonly face?: FaceName;
  /** mm in the face's view. */
  readonly at?: readonly [number, number];
  /** A whole sentence with names and figures. */
  readonly message: string;
}

/** A tab as planned and as the wood really is. */
export interface TabReport {
  readonly outline: string;
  readonly contour: number;
  readonly fraction: number;
  /** Middle of the tab on the outline, in the view of the cut's face, mm. */
  readonly at: readonly [number, number];
  /** Length of the wood at its top, mm. */
  readonly length: number;
  /** Height of the top above the far face, mm. */
  readonly height: number;
  /** `height`: lowest to highest wood at the weakest place, mm; `area`: least section between part and frame, mm². */
  readonly wood: { readonly height: number; readonly area: number };
  readonly holds: boolean;
}

export interface CutReport {
  readonly id: string;
  readonly seconds: number;
  /** All feed moves in 3D, mm. */
  readonly cutLength: number;
  /** All rapids, mm. */
  readonly travelLength: number;
  /** Wood this cut takes that was still there, mm³. */
  readonly removed: number;
  /** Lowest z in program coordinates, mm; null for a cut without moves. */
  readonly minZ: number | null;
  readonly tabs: readonly TabReport[];
}

export interface ProgramReport {
  readonly file: string;
  readonly face: FaceName;
  readonly cutters: readonly string[];
  readonly cuts: readonly string[];
  readonly seconds: number;
  readonly lines: number;
  readonly sha256: string;
  /** Of the cutter's reference point over all moves, program coordinates, mm. */
  readonly bounds: {
    readonly min: readonly [number, number, number];
    readonly max: readonly [number, number, number];
  };
}

/** `report.json`, whole. */
export interface Report {
  readonly job: string;
  readonly seconds: number;
  readonly programs: readonly ProgramReport[];
  readonly cuts: readonly CutReport[];
  readonly findings: readonly Finding[];
}
