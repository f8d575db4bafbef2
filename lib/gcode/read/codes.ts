/** Words of one group exclude one another on a line (NIST RS274NGC, table 4). */
export type ModalGroup =
  | 'motion'
  | 'plane'
  | 'distance'
  | 'arc distance'
  | 'feed mode'
  | 'units'
  | 'radius offset'
  | 'length offset'
  | 'return level'
  | 'work offset'
  | 'path control'
  | 'non-modal'
  | 'stop'
  | 'tool change'
  | 'spindle'
  | 'coolant'
  | 'overrides'
  | 'program number';

export interface Code {
  readonly group: ModalGroup;
  /** Set where the word is known but not allowed: a sentence that says why. */
  readonly refused?: string;
}

const KNOWS_MACHINE = 'goes to a place that only the machine knows; write the moves out.';

/** G words by their number times ten. */
export const G_CODES: ReadonlyMap<number, Code> = new Map<number, Code>([
  [0, { group: 'motion' }],
  [10, { group: 'motion' }],
  [20, { group: 'motion' }],
  [30, { group: 'motion' }],
  [40, { group: 'non-modal' }],
  [100, { group: 'non-modal', refused: 'G10 changes offsets that are kept in the machine.' }],
  [170, { group: 'plane' }],
  [180, { group: 'plane', refused: 'G18: arcs are read in the XY plane (G17) only.' }],
  [190, { group: 'plane', refused: 'G19: arcs are read in the XY plane (G17) only.' }],
  [200, { group: 'units' }],
  [210, { group: 'units' }],
  [280, { group: 'non-modal', refused: `G28 ${KNOWS_MACHINE}` }],
  [300, { group: 'non-modal', refused: `G30 ${KNOWS_MACHINE}` }],
  [382, { group: 'motion' }],
  [400, { group: 'radius offset' }],
  [410, { group: 'radius offset', refused: 'G41 needs the tool table of the machine.' }],
  [420, { group: 'radius offset', refused: 'G42 needs the tool table of the machine.' }],
  [430, { group: 'length offset' }],
  [490, { group: 'length offset' }],
  [530, { group: 'non-modal', refused: `G53 ${KNOWS_MACHINE}` }],
  ...[540, 550, 560, 570, 580, 590].map((number): [number, Code] => [number, { group: 'work offset' }]),
  [610, { group: 'path control' }],
  [640, { group: 'path control' }],
  [800, { group: 'motion' }],
  [810, { group: 'motion' }],
  [830, { group: 'motion' }],
  [900, { group: 'distance' }],
  [910, { group: 'distance' }],
  [901, { group: 'arc distance' }],
  [911, { group: 'arc distance' }],
  [920, { group: 'non-modal', refused: 'G92 moves the origin in a way that outlasts the program.' }],
  [930, { group: 'feed mode', refused: 'G93 (inverse time) is not read; write feeds per minute (G94).' }],
  [940, { group: 'feed mode' }],
  [980, { group: 'return level' }],
  [990, { group: 'return level' }],
]);

export const M_CODES: ReadonlyMap<number, Code> = new Map<number, Code>([
  [0, { group: 'stop' }],
  [1, { group: 'stop' }],
  [2, { group: 'stop' }],
  [30, { group: 'stop' }],
  [3, { group: 'spindle' }],
  [4, { group: 'spindle' }],
  [5, { group: 'spindle' }],
  [6, { group: 'tool change' }],
  [7, { group: 'coolant' }],
  [8, { group: 'coolant' }],
  [9, { group: 'coolant' }],
  [48, { group: 'overrides' }],
  [49, { group: 'overrides' }],
]);

/** Letters that carry a value; each stands at most once on a line. */
export const VALUE_LETTERS: ReadonlySet<string> = new Set([...'FHIJKLOPQRSTXYZ']);
