import type { Vec } from '@/lib/geometry/vec';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import type { Shape } from '@/lib/job/shape-schema';
import type { SectionLine, Selection } from '../session';

export type ToolId = 'select' | 'rect' | 'ellipse' | 'polyline' | 'points' | 'section' | 'comment';

/** What lies under the pointer. */
export type Target =
  | { readonly kind: 'board' }
  | { readonly kind: 'outline'; readonly id: string }
  | { readonly kind: 'section'; readonly part: 'from' | 'to' | 'line' };

export interface ToolPointer {
  /** mm in the view of the face that is up, as the hand has it. */
  readonly at: Vec;
  /** The same, snapped to what is near. */
  readonly snapped: Vec;
  readonly target: Target;
  /** Adds to the selection, keeps a square or a right angle. */
  readonly shift: boolean;
}

/** What a hand or a keyboard does, free of any screen. */
export type ToolEvent =
  | { readonly type: 'down' | 'move' | 'up' | 'double'; readonly pointer: ToolPointer }
  | { readonly type: 'key'; readonly key: 'Enter' | 'Escape' | 'Backspace' }
  /** Sizes typed while something is being drawn: mm, null for one that was left as it is. */
  | { readonly type: 'sizes'; readonly values: readonly (number | null)[] };

/** What a tool asks of the editor. */
export type ToolEffect =
  | { readonly kind: 'preview'; readonly job: Job }
  | { readonly kind: 'apply'; readonly label: string; readonly job: Job }
  | { readonly kind: 'cancel' }
  | { readonly kind: 'select'; readonly selection: Partial<Selection> }
  | { readonly kind: 'section'; readonly line: SectionLine }
  | { readonly kind: 'comment'; readonly at: Vec }
  | { readonly kind: 'tool'; readonly tool: ToolId };

export interface ToolStep<State> {
  readonly state: State;
  readonly effects: readonly ToolEffect[];
}

/** What a tool may know; the document is the one before the gesture. */
export interface ToolContext {
  readonly job: Job;
  readonly face: Face;
  readonly selection: Selection;
  readonly section: SectionLine;
  /** Outlines that a box touches, in the view of the face that is up. */
  outlinesWithin(from: Vec, to: Vec): readonly string[];
}

/** A figure that is shown at the cursor and can be typed there. */
export interface LiveSize {
  readonly label: string;
  readonly value: number;
  readonly unit: 'mm' | 'deg';
}

/** What is drawn of a gesture that has not become part of the document. */
export type Draft =
  | { readonly kind: 'shape'; readonly shape: Shape; readonly sizes: readonly LiveSize[]; readonly at: Vec }
  | { readonly kind: 'box'; readonly from: Vec; readonly to: Vec };

/** A tool: its states are its own closed union, its step a pure function. */
export interface Tool<State> {
  readonly idle: State;
  step(state: State, event: ToolEvent, context: ToolContext): ToolStep<State>;
  draft(state: State): Draft | null;
}

/** Stay as it is. */
export function stay<State>(state: State): ToolStep<State> {
  return { state, effects: [] };
}
