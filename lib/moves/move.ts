/**
 * The one language between planning and the program writer. Coordinates are those of the view of the face being cut,
 * before its zero: x, y in mm on the face, z in mm against the nominal face (0 on it, negative below, positive above).
 */
export interface Position {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/** Straight, as fast as the machine goes; never in wood. */
export interface RapidMove {
  readonly kind: 'rapid';
  readonly to: Position;
}

/** Straight at `feed` mm/min along the path. */
export interface FeedMove {
  readonly kind: 'feed';
  readonly to: Position;
  readonly feed: number;
}

/** Arc in the XY plane about (`cx`, `cy`), helical where z differs; ends = start is one full turn. */
export interface ArcMove {
  readonly kind: 'arc';
  readonly to: Position;
  readonly cx: number;
  readonly cy: number;
  /** Counter-clockwise seen from above (G3). */
  readonly ccw: boolean;
  readonly feed: number;
}

/** Stand still with the spindle turning. */
export interface DwellMove {
  readonly kind: 'dwell';
  readonly seconds: number;
}

export type Move = RapidMove | FeedMove | ArcMove | DwellMove;
