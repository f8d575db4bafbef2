import { contoursToPathData } from '@/lib/geometry/path-data';
import { DEGREES, distance, vec, type Vec } from '@/lib/geometry/vec';
import { addOutline } from '../edits/edit-outlines';
import { straightened } from './select-tool';
import { stay, type Tool, type ToolContext, type ToolPointer, type ToolStep } from './tool';

type PolylineState =
  | { readonly name: 'idle' }
  | { readonly name: 'drawing'; readonly points: readonly Vec[]; readonly next: Vec };

/** Clicking this near the first point, mm, closes the line. */
const CLOSING_REACH = 1.5;
/** Points nearer than this are one point. */
const SAME_PLACE = 1e-3;
const IDLE: PolylineState = { name: 'idle' };

/**
 * Straight lines from click to click. Clicking the first point closes it; Enter or a double click ends it open; Backspace
 * takes the last point back; shift keeps a line level or upright; typed length and angle place the next point exactly.
 */
export const polylineTool: Tool<PolylineState> = {
  idle: IDLE,
  step(state, event, context) {
    switch (event.type) {
      case 'down':
        return clicked(state, event.pointer, context);
      case 'move':
        return stay(state.name === 'drawing' ? { ...state, next: placeOf(state, event.pointer) } : state);
      case 'double':
        return finish(state, false, context);
      case 'key':
        return keyed(state, event.key, context);
      case 'sizes':
        return sized(state, event.values);
      case 'up':
        return stay(state);
    }
  },
  draft(state) {
    if (state.name === 'idle') return null;
    const { points, next } = state;
    const last = points.at(-1);
    if (!last || distance(last, next) < SAME_PLACE) return null;
    const d = pathData([...points, next], false);
    return {
      kind: 'shape',
      shape: { type: 'path', d, fillRule: 'nonzero' },
      sizes: [
        { label: 'L', value: distance(last, next), unit: 'mm' },
        { label: 'A', value: angleOf(last, next), unit: 'deg' },
      ],
      at: next,
    };
  },
};

type Drawing = Extract<PolylineState, { name: 'drawing' }>;

function clicked(state: PolylineState, pointer: ToolPointer, context: ToolContext): ToolStep<PolylineState> {
  if (state.name === 'idle') {
    return stay({ name: 'drawing', points: [pointer.snapped], next: pointer.snapped });
  }
  const [first] = state.points;
  if (first && state.points.length > 2 && distance(pointer.at, first) < CLOSING_REACH) {
    return finish(state, true, context);
  }
  return stay(withPoint(state, placeOf(state, pointer)));
}

function placeOf({ points }: Drawing, { snapped, shift }: ToolPointer): Vec {
  const last = points.at(-1);
  return shift && last ? straightened(last, snapped) : snapped;
}

function withPoint(state: Drawing, point: Vec): Drawing {
  const last = state.points.at(-1);
  const points = last && distance(last, point) < SAME_PLACE ? state.points : [...state.points, point];
  return { ...state, points, next: point };
}

function keyed(
  state: PolylineState,
  key: 'Enter' | 'Escape' | 'Backspace',
  context: ToolContext,
): ToolStep<PolylineState> {
  if (state.name === 'idle') {
    return key === 'Escape' ? { state, effects: [{ kind: 'tool', tool: 'select' }] } : stay(state);
  }
  if (key === 'Enter') return finish(state, false, context);
  if (key === 'Escape') return stay(IDLE);
  const points = state.points.slice(0, -1);
  return stay(points.length === 0 ? IDLE : { ...state, points });
}

/** Length and angle from the last point; the cursor's where one was left as it is. */
function sized(state: PolylineState, [length, angle]: readonly (number | null)[]): ToolStep<PolylineState> {
  if (state.name === 'idle') return stay(state);
  const last = state.points.at(-1);
  if (!last) return stay(state);
  const far = length ?? distance(last, state.next);
  const turn = (angle ?? angleOf(last, state.next)) * DEGREES;
  return stay(withPoint(state, vec(last.x + far * Math.cos(turn), last.y + far * Math.sin(turn))));
}

function finish(state: PolylineState, closed: boolean, context: ToolContext): ToolStep<PolylineState> {
  if (state.name === 'idle' || state.points.length < (closed ? 3 : 2)) return stay(IDLE);
  const shape = { type: 'path' as const, d: pathData(state.points, closed), fillRule: 'nonzero' as const };
  const { job, id } = addOutline(context.job, context.face, shape, closed ? 'Outline' : 'Line');
  return {
    state: IDLE,
    effects: [
      { kind: 'apply', label: closed ? 'Draw outline' : 'Draw line', job },
      { kind: 'select', selection: { outlines: [id] } },
      { kind: 'tool', tool: 'select' },
    ],
  };
}

function pathData([start, ...rest]: readonly Vec[], closed: boolean): string {
  if (!start) return '';
  const lines = rest.map((to) => ({ kind: 'line' as const, to }));
  const segments = closed ? [...lines, { kind: 'line' as const, to: start }] : lines;
  return contoursToPathData([{ start, segments, closed }]);
}

function angleOf(from: Vec, to: Vec): number {
  return Math.atan2(to.y - from.y, to.x - from.x) / DEGREES;
}
