/** What the words so far have put in force. Lengths in mm. */
export interface MachineState {
  /** mm in a unit of the program. */
  unit: 1 | 25.4;
  unitSaid: boolean;
  absolute: boolean;
  absoluteCentres: boolean;
  /** Number of the motion word in force, or null after G80. */
  motion: number | null;
  /** mm/min; null until said, and after a change of units. */
  feed: number | null;
  rpm: number;
  spindle: 'off' | 'clockwise' | 'counter-clockwise';
  tool: number | null;
  /** Known only once the program has named them. */
  x: number | null;
  y: number | null;
  z: number | null;
  cycle: CycleState;
}

/** What a canned cycle keeps from line to line (NIST RS274NGC 3.5.16). */
export interface CycleState {
  z: number | null;
  r: number | null;
  q: number | null;
  /** G98: back to where z was before; G99: to R. */
  returnsToInitial: boolean;
}

/** The modes of a controller that has just been switched on: mm, absolute, feed per minute. */
export function initialState(): MachineState {
  return {
    unit: 1,
    unitSaid: false,
    absolute: true,
    absoluteCentres: false,
    motion: 0,
    feed: null,
    rpm: 0,
    spindle: 'off',
    tool: null,
    x: null,
    y: null,
    z: null,
    cycle: { z: null, r: null, q: null, returnsToInitial: true },
  };
}
