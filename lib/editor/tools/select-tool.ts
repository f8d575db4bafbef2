import { distance, subtract, vec, type Vec } from '@/lib/geometry/vec';
import { moveOutlines } from '../edits/edit-outlines';
import type { SectionLine } from '../session';
import { stay, type Tool, type ToolContext, type ToolEffect, type ToolPointer, type ToolStep } from './tool';

type Grip = 'from' | 'to' | 'line';

type SelectState =
  | { readonly name: 'idle' }
  | { readonly name: 'pressed'; readonly down: ToolPointer; readonly ids: readonly string[] }
  | { readonly name: 'moving'; readonly down: ToolPointer; readonly ids: readonly string[] }
  | { readonly name: 'boxing'; readonly from: Vec; readonly to: Vec; readonly adds: boolean }
  | { readonly name: 'section'; readonly down: Vec; readonly before: SectionLine; readonly grip: Grip };

/** A press that moves less than this, mm, is a click; fingers and mice tremble. */
const CLICK_SLACK = 0.4;
const IDLE: SelectState = { name: 'idle' };

/** Selects by a click or a box, moves what is selected, and moves the section line by its ends or as a whole. */
export const selectTool: Tool<SelectState> = {
  idle: IDLE,
  step(state, event, context) {
    switch (event.type) {
      case 'down':
        return press(event.pointer, context);
      case 'move':
        return drag(state, event.pointer, context);
      case 'up':
        return release(state, event.pointer, context);
      case 'key':
        return event.key === 'Escape' ? escape(state) : stay(state);
      case 'double':
      case 'sizes':
        return stay(state);
    }
  },
  draft: (state) => (state.name === 'boxing' ? { kind: 'box', from: state.from, to: state.to } : null),
};

function press(down: ToolPointer, context: ToolContext): ToolStep<SelectState> {
  const { target } = down;
  if (target.kind === 'section') {
    return stay({ name: 'section', down: down.at, before: context.section, grip: target.part });
  }
  if (target.kind === 'board') return stay({ name: 'boxing', from: down.at, to: down.at, adds: down.shift });
  const chosen = context.selection.outlines;
  if (chosen.includes(target.id) && !down.shift) return stay({ name: 'pressed', down, ids: chosen });
  const ids = down.shift ? toggled(chosen, target.id) : [target.id];
  return { state: { name: 'pressed', down, ids }, effects: [selecting(ids, down.shift)] };
}

function drag(state: SelectState, pointer: ToolPointer, context: ToolContext): ToolStep<SelectState> {
  switch (state.name) {
    case 'idle':
      return stay(state);
    case 'pressed':
      if (distance(pointer.at, state.down.at) < CLICK_SLACK || state.ids.length === 0) return stay(state);
      return drag({ ...state, name: 'moving' }, pointer, context);
    case 'moving': {
      const job = moved(state, pointer, context);
      return { state, effects: [{ kind: 'preview', job }] };
    }
    case 'boxing':
      return stay({ ...state, to: pointer.at });
    case 'section':
      return { state, effects: [{ kind: 'section', line: movedSection(state, pointer) }] };
  }
}

function release(state: SelectState, pointer: ToolPointer, context: ToolContext): ToolStep<SelectState> {
  switch (state.name) {
    case 'moving': {
      const label = state.ids.length === 1 ? 'Move outline' : `Move ${state.ids.length} outlines`;
      return { state: IDLE, effects: [{ kind: 'apply', label, job: moved(state, pointer, context) }] };
    }
    case 'boxing': {
      const isClick = distance(state.from, state.to) < CLICK_SLACK;
      const found = isClick ? [] : context.outlinesWithin(state.from, state.to);
      const before = state.adds ? context.selection.outlines : [];
      const ids = [...new Set([...before, ...found])];
      return {
        state: IDLE,
        effects: [
          isClick && !state.adds
            ? { kind: 'select', selection: { outlines: [], cut: null } }
            : selecting(ids, state.adds),
        ],
      };
    }
    case 'idle':
    case 'pressed':
    case 'section':
      return stay(IDLE);
  }
}

function escape(state: SelectState): ToolStep<SelectState> {
  switch (state.name) {
    case 'section':
      return { state: IDLE, effects: [{ kind: 'section', line: state.before }] };
    case 'moving':
      return { state: IDLE, effects: [{ kind: 'cancel' }] };
    case 'idle':
      return { state: IDLE, effects: [{ kind: 'select', selection: { outlines: [], cut: null } }] };
    case 'pressed':
    case 'boxing':
      return stay(IDLE);
  }
}

/** From the document before the gesture by the whole way, so that no rounding adds up. */
function moved(
  { down, ids }: { down: ToolPointer; ids: readonly string[] },
  pointer: ToolPointer,
  { job, face }: ToolContext,
): ReturnType<typeof moveOutlines> {
  let { x, y } = subtract(pointer.snapped, down.snapped);
  if (pointer.shift) {
    if (Math.abs(x) >= Math.abs(y)) y = 0;
    else x = 0;
  }
  return moveOutlines(job, ids, face, x, y);
}

function movedSection(
  { before, down, grip }: { before: SectionLine; down: Vec; grip: Grip },
  pointer: ToolPointer,
): SectionLine {
  if (grip === 'line') {
    const { x, y } = subtract(pointer.at, down);
    const by = (p: Vec): Vec => vec(p.x + x, p.y + y);
    return { from: by(before.from), to: by(before.to) };
  }
  const fixed = grip === 'from' ? before.to : before.from;
  const free = pointer.shift ? straightened(fixed, pointer.snapped) : pointer.snapped;
  return grip === 'from' ? { from: free, to: fixed } : { from: fixed, to: free };
}

/** `to` brought level or upright with `from`, whichever is nearer. */
export function straightened(from: Vec, to: Vec): Vec {
  return Math.abs(to.x - from.x) >= Math.abs(to.y - from.y) ? vec(to.x, from.y) : vec(from.x, to.y);
}

function toggled(ids: readonly string[], id: string): readonly string[] {
  return ids.includes(id) ? ids.filter((other) => other !== id) : [...ids, id];
}

/** What is selected anew is what the inspector is about; what is added keeps the cut, which may take it up. */
function selecting(outlines: readonly string[], adds: boolean): ToolEffect {
  return { kind: 'select', selection: adds ? { outlines } : { outlines, cut: null } };
}
