/**
 * Every tolerance of the core in one place, in mm unless said. A branch that depends on a sign uses exact
 * predicates instead; these are for lengths.
 */

/** Greatest distance between a curve and the chords that stand for it. */
export const FLATTEN_TOLERANCE = 0.01;

/** Nothing outside what was asked for may be cut by more than this. */
export const GOUGE_LIMIT = 0.02;

/** Floors, bevels and walls are right within this. */
export const SIZE_TOLERANCE = 0.01;

/** Points nearer than this are one point (below any program's last decimal). */
export const SAME_POINT = 1e-6;

/** An outline this near to an edge of the board reaches it. */
export const EDGE_REACH = 0.01;

/** Moves within this of one arc leave as G2/G3. */
export const ARC_FIT_TOLERANCE = 0.005;

/** Integer units per mm for polygon clipping: exact to 0.1 µm and inside clipper's fast range up to 4.7 m. */
export const CLIPPER_SCALE = 1e4;

/** Rings are thinned by this between repeated offsets; without it their vertices multiply ring on ring. */
export const RING_SIMPLIFY = 0.002;

/** A quotient this little above a whole number does not ask for one more layer (binary rounding, not wood). */
export const COUNT_SLACK = 1e-9;

/** How far into the spoilboard a cutter may go before it is a finding. */
export const SPOILBOARD_ALLOWANCE = 1;

/** Corner rounding that a controller is taken to allow, for the time estimate. */
export const JUNCTION_DEVIATION = 0.01;
