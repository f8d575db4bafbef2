import { distance, type Vec } from '@/lib/geometry/vec';
import type { Shape } from '@/lib/job/shape-schema';
import { addOutline } from '../edits/edit-outlines';
import { stay, type Tool, type ToolContext, type ToolPointer, type ToolStep } from './tool';

type BoxState =
  | { readonly name: 'idle' }
  | {
      readonly name: 'drawing';
      readonly from: Vec;
      readonly to: Vec;
      readonly square: boolean;
      readonly held: boolean;
    };

/** Smaller than this, mm, is a slip of the hand and not a shape. */
const SMALLEST = 0.1;
const IDLE: BoxState = { name: 'idle' };

/**
 * A tool that draws a shape into a box: press, drag and let go, or click one corner and then the other. Shift keeps it
 * square; typed sizes make it exact.
 */
function boxTool(label: string, shapeIn: (box: Corners) => Shape): Tool<BoxState> {
  const finish = (state: BoxState, context: ToolContext): ToolStep<BoxState> => {
    if (state.name === 'idle') return stay(state);
    const corners = cornersOf(state);
    if (corners.width < SMALLEST || corners.height < SMALLEST) return stay(IDLE);
    const { job, id } = addOutline(context.job, context.face, shapeIn(corners));
    return {
      state: IDLE,
      effects: [
        { kind: 'apply', label, job },
        { kind: 'select', selection: { outlines: [id] } },
        { kind: 'tool', tool: 'select' },
      ],
    };
  };
  return {
    idle: IDLE,
    step(state, event, context) {
      switch (event.type) {
        case 'down':
          return stay(
            state.name === 'drawing'
              ? { ...pulled(state, event.pointer), held: true }
              : started(event.pointer),
          );
        case 'move':
          return stay(state.name === 'drawing' ? pulled(state, event.pointer) : state);
        case 'up':
          return released(state, event.pointer, context, finish);
        case 'key':
          return event.key === 'Enter' ? finish(state, context) : stay(event.key === 'Escape' ? IDLE : state);
        case 'sizes':
          return finish(sized(state, event.values), context);
        case 'double':
          return stay(state);
      }
    },
    draft(state) {
      if (state.name === 'idle') return null;
      const corners = cornersOf(state);
      const { width, height } = corners;
      if (width === 0 || height === 0) return null;
      const sizes = [
        { label: 'W', value: width, unit: 'mm' as const },
        { label: 'H', value: height, unit: 'mm' as const },
      ];
      return { kind: 'shape', shape: shapeIn(corners), sizes, at: state.to };
    },
  };
}

export const rectTool = boxTool('Draw rectangle', ({ x, y, width, height }) => ({
  type: 'rect',
  x,
  y,
  width,
  height,
  radius: 0,
  rotate: 0,
}));

export const ellipseTool = boxTool('Draw ellipse', ({ x, y, width, height }) => ({
  type: 'ellipse',
  cx: x + width / 2,
  cy: y + height / 2,
  rx: width / 2,
  ry: height / 2,
  rotate: 0,
}));

interface Corners {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

type Drawing = Extract<BoxState, { name: 'drawing' }>;

function started({ snapped, shift }: ToolPointer): Drawing {
  return { name: 'drawing', from: snapped, to: snapped, square: shift, held: true };
}

function pulled(state: Drawing, { snapped, shift }: ToolPointer): Drawing {
  return { ...state, to: snapped, square: shift };
}

/** Letting go where it began is a click: the second corner is clicked too. */
function released(
  state: BoxState,
  pointer: ToolPointer,
  context: ToolContext,
  finish: (state: BoxState, context: ToolContext) => ToolStep<BoxState>,
): ToolStep<BoxState> {
  if (state.name === 'idle') return stay(state);
  const end = pulled(state, pointer);
  if (distance(end.from, end.to) < SMALLEST) return stay({ ...end, held: false });
  return finish(end, context);
}

function cornersOf({ from, to, square }: Drawing): Corners {
  let dx = to.x - from.x;
  let dy = to.y - from.y;
  if (square) {
    const side = Math.max(Math.abs(dx), Math.abs(dy));
    dx = dx < 0 ? -side : side;
    dy = dy < 0 ? -side : side;
  }
  return {
    x: Math.min(from.x, from.x + dx),
    y: Math.min(from.y, from.y + dy),
    width: Math.abs(dx),
    height: Math.abs(dy),
  };
}

/** Typed sizes keep the corner where the drawing began and the side to which it was pulled. */
function sized(state: BoxState, [width, height]: readonly (number | null)[]): BoxState {
  if (state.name === 'idle') return state;
  const { from, to } = state;
  const along = (start: number, end: number, size: number | null | undefined): number =>
    size === null || size === undefined ? end : start + (end < start ? -size : size);
  return { ...state, to: { x: along(from.x, to.x, width), y: along(from.y, to.y, height) }, square: false };
}
