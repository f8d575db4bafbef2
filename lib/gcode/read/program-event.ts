/** A position in program coordinates, always mm whatever the program's unit. */
export interface ProgramPoint {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

interface EventPlace {
  /** 1-based line of the text. */
  readonly line: number;
}

/** G0. `from` is null along axes that the program has not named before: where the machine stood is not known. */
export interface RapidEvent extends EventPlace {
  readonly kind: 'rapid';
  readonly from: ProgramPoint | null;
  readonly to: ProgramPoint;
}

/** G1, mm/min along the path. */
export interface FeedEvent extends EventPlace {
  readonly kind: 'feed';
  readonly from: ProgramPoint;
  readonly to: ProgramPoint;
  readonly feed: number;
}

/** G2 or G3 in the XY plane, helical where z differs. `sweep`: signed radians, positive counter-clockwise, whole turns in. */
export interface ArcEvent extends EventPlace {
  readonly kind: 'arc';
  readonly from: ProgramPoint;
  readonly to: ProgramPoint;
  readonly center: { readonly x: number; readonly y: number };
  readonly sweep: number;
  readonly feed: number;
}

/** G38.2: the contact is not known; the move is given as far as it may go. */
export interface ProbeEvent extends EventPlace {
  readonly kind: 'probe';
  readonly from: ProgramPoint;
  readonly to: ProgramPoint;
  readonly feed: number;
}

export interface DwellEvent extends EventPlace {
  readonly kind: 'dwell';
  readonly seconds: number;
}

/** The spindle as it is after the line: rpm, 0 when it stands. */
export interface SpindleEvent extends EventPlace {
  readonly kind: 'spindle';
  readonly rpm: number;
  readonly clockwise: boolean;
}

/** M6 with the tool that T named last. */
export interface ToolEvent extends EventPlace {
  readonly kind: 'tool';
  readonly tool: number;
}

/** M0 or M1: waits for the person. */
export interface StopEvent extends EventPlace {
  readonly kind: 'stop';
  readonly optional: boolean;
}

/** A comment's text without its brackets. */
export interface CommentEvent extends EventPlace {
  readonly kind: 'comment';
  readonly text: string;
}

/** M2 or M30; nothing after it is read. */
export interface EndEvent extends EventPlace {
  readonly kind: 'end';
}

export type MotionEvent = RapidEvent | FeedEvent | ArcEvent | ProbeEvent;
export type ProgramEvent =
  MotionEvent | DwellEvent | SpindleEvent | ToolEvent | StopEvent | CommentEvent | EndEvent;
