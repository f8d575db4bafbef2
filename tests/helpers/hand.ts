import { createEditor, type Editor } from '@/lib/editor/editor-store';
import { outlinesWithin, pickFilled, pickLine } from '@/lib/editor/pick';
import { createSceneMaker } from '@/lib/editor/scene';
import { createToolRunner } from '@/lib/editor/tool-runner';
import type { Draft, Target, ToolId } from '@/lib/editor/tools/tool';
import type { Vec } from '@/lib/geometry/vec';
import { parseJob } from '@/lib/job/parse-job';
import { sampleJob } from './sample-job';

/** A hand at the bench without a screen: presses, drags and types, and lets the test look at what came of it. */
export interface Hand {
  readonly editor: Editor;
  readonly comments: Vec[];
  tool(tool: ToolId): Hand;
  press(x: number, y: number, keys?: { shift?: boolean }): Hand;
  move(x: number, y: number, keys?: { shift?: boolean }): Hand;
  lift(x: number, y: number, keys?: { shift?: boolean }): Hand;
  drag(from: readonly [number, number], to: readonly [number, number], keys?: { shift?: boolean }): Hand;
  click(x: number, y: number, keys?: { shift?: boolean }): Hand;
  key(key: 'Enter' | 'Escape' | 'Backspace'): Hand;
  sizes(...values: (number | null)[]): Hand;
  draft(): Draft | null;
}

export function handAtBench(options: { readOnly?: boolean; job?: unknown } = {}): Hand {
  const parsed = parseJob(options.job ?? sampleJob());
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.error));
  const editor = createEditor(parsed.value);
  editor.look({ face: 'A' });
  const makeScene = createSceneMaker(new Map());
  const scene = () => makeScene(editor.job(), editor.store.getState().session.face);
  const comments: Vec[] = [];
  const runner = createToolRunner(editor, {
    readOnly: options.readOnly ?? false,
    outlinesWithin: (a, b) => outlinesWithin(scene(), a, b),
    onComment: (at) => comments.push(at),
    onChange: () => undefined,
  });
  const targetAt = (at: Vec): Target => {
    const { section } = editor.store.getState().session;
    for (const part of ['from', 'to'] as const)
      if (Math.hypot(section[part].x - at.x, section[part].y - at.y) < 1) return { kind: 'section', part };
    const id = pickLine(scene(), at, 1) ?? pickFilled(scene(), at);
    return id === null ? { kind: 'board' } : { kind: 'outline', id };
  };
  const send = (type: 'down' | 'move' | 'up', x: number, y: number, shift = false): void => {
    const at = { x, y };
    runner.send({ type, pointer: { at, snapped: at, target: targetAt(at), shift } });
  };
  const hand: Hand = {
    editor,
    comments,
    tool: (tool) => (editor.look({ tool }), hand),
    press: (x, y, keys) => (send('down', x, y, keys?.shift), hand),
    move: (x, y, keys) => (send('move', x, y, keys?.shift), hand),
    lift: (x, y, keys) => (send('up', x, y, keys?.shift), hand),
    drag: ([x1, y1], [x2, y2], keys) =>
      hand
        .press(x1, y1, keys)
        .move((x1 + x2) / 2, (y1 + y2) / 2, keys)
        .move(x2, y2, keys)
        .lift(x2, y2, keys),
    click: (x, y, keys) => hand.press(x, y, keys).lift(x, y, keys),
    key: (key) => (runner.send({ type: 'key', key }), hand),
    sizes: (...values) => (runner.send({ type: 'sizes', values }), hand),
    draft: () => runner.draft(),
  };
  return hand;
}
