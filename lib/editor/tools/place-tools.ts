import { addOutline } from '../edits/edit-outlines';
import { straightened } from './select-tool';
import { stay, type Tool } from './tool';
import type { Vec } from '@/lib/geometry/vec';

interface Ready {
  readonly name: 'idle';
}
const READY: Ready = { name: 'idle' };

/** Puts a point with each click: holes are drilled there. Clicks go into the selected points where there are any. */
export const pointsTool: Tool<Ready> = {
  idle: READY,
  step(state, event, { job, face, selection }) {
    if (event.type === 'key' && event.key === 'Escape')
      return { state, effects: [{ kind: 'tool', tool: 'select' }] };
    if (event.type !== 'down') return stay(state);
    const { x, y } = event.pointer.snapped;
    const open = job.outlines.find(
      (outline) =>
        selection.outlines.includes(outline.id) && outline.shape.type === 'points' && outline.face === face,
    );
    if (open?.shape.type === 'points') {
      const shape = { ...open.shape, at: [...open.shape.at, [x, y] as [number, number]] };
      const outlines = job.outlines.map((outline) => (outline === open ? { ...outline, shape } : outline));
      return { state, effects: [{ kind: 'apply', label: 'Add point', job: { ...job, outlines } }] };
    }
    const added = addOutline(job, face, { type: 'points', at: [[x, y]] });
    return {
      state,
      effects: [
        { kind: 'apply', label: 'Add point', job: added.job },
        { kind: 'select', selection: { outlines: [added.id] } },
      ],
    };
  },
  draft: () => null,
};

/** Says where a comment belongs. */
export const commentTool: Tool<Ready> = {
  idle: READY,
  step(state, event) {
    if (event.type === 'down') return { state, effects: [{ kind: 'comment', at: event.pointer.at }] };
    if (event.type === 'key' && event.key === 'Escape')
      return { state, effects: [{ kind: 'tool', tool: 'select' }] };
    return stay(state);
  },
  draft: () => null,
};

type SectionState = Ready | { readonly name: 'drawing'; readonly from: Vec };

/** Draws the section line anew, from press to release. */
export const sectionTool: Tool<SectionState> = {
  idle: READY,
  step(state, event) {
    if (event.type === 'key' && event.key === 'Escape')
      return { state: READY, effects: [{ kind: 'tool', tool: 'select' }] };
    if (event.type === 'down') return stay({ name: 'drawing', from: event.pointer.snapped });
    if (state.name !== 'drawing' || (event.type !== 'move' && event.type !== 'up')) return stay(state);
    const { snapped, shift } = event.pointer;
    const to = shift ? straightened(state.from, snapped) : snapped;
    const isLine = Math.hypot(to.x - state.from.x, to.y - state.from.y) > 1;
    const line = isLine ? [{ kind: 'section' as const, line: { from: state.from, to } }] : [];
    if (event.type === 'move') return { state, effects: line };
    return { state: READY, effects: [...line, { kind: 'tool', tool: 'select' }] };
  },
  draft: () => null,
};
