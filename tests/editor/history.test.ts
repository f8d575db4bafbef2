import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { record, redo, startHistory, undo } from '@/lib/editor/history';
import { handAtBench } from '../helpers/hand';

describe('history', () => {
  it('is what a plain list of documents would be, for any run of changes, undos and redos', () => {
    const step = fc.oneof(fc.constant('undo'), fc.constant('redo'), fc.integer({ min: 1, max: 1e6 }));
    fc.assert(
      fc.property(fc.array(step, { maxLength: 60 }), (steps) => {
        let history = startHistory(0);
        let list = [0];
        let at = 0;
        for (const one of steps) {
          if (one === 'undo') {
            history = undo(history);
            at = Math.max(0, at - 1);
          } else if (one === 'redo') {
            history = redo(history);
            at = Math.min(list.length - 1, at + 1);
          } else if (one !== history.present) {
            history = record(history, `to ${one}`, one as number);
            list = [...list.slice(0, at + 1), one as number];
            at++;
          }
          expect(history.present).toBe(list[at]);
        }
      }),
      { seed: 5, numRuns: 300 },
    );
  });

  it('names what is undone and what would come back', () => {
    const hand = handAtBench().tool('rect').drag([0, 0], [10, 10]).drag([15, 50], [20, 50]);
    const names = () => {
      const { past, future } = hand.editor.store.getState().history;
      return [past.at(-1)?.label, future[0]?.label];
    };
    expect(names()).toEqual(['Move outline', undefined]);
    hand.editor.undo();
    expect(names()).toEqual(['Draw rectangle', 'Move outline']);
    hand.editor.undo();
    expect(names()).toEqual([undefined, 'Draw rectangle']);
  });

  it('keeps redo when only the selection changes', () => {
    const hand = handAtBench().tool('rect').drag([0, 0], [10, 10]);
    hand.editor.undo();
    hand.click(15, 50);
    hand.editor.redo();
    expect(hand.editor.job().outlines).toHaveLength(3);
  });

  it('lets go of what an undo takes away', () => {
    const hand = handAtBench().tool('rect').drag([0, 0], [10, 10]);
    hand.editor.undo();
    expect(hand.editor.store.getState().session.selection.outlines).toEqual([]);
  });
});
