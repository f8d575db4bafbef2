import { describe, expect, it } from 'vitest';
import { deleteCut, duplicateCut, moveCut, setCutField } from '@/lib/editor/edits/edit-cuts';
import { deleteOutlines, duplicateOutlines } from '@/lib/editor/edits/edit-outlines';
import { addCut } from '@/lib/editor/edits/new-cut';
import { setShapeFrame, shapeFrame } from '@/lib/editor/edits/shape-frame';
import { mendsFor } from '@/lib/editor/mends';
import type { Job } from '@/lib/job/job-schema';
import { parseJob } from '@/lib/job/parse-job';
import type { Shape } from '@/lib/job/shape-schema';
import { makeFinding } from '@/lib/report/make-finding';
import { sampleJob } from '../helpers/sample-job';

function sample(): Job {
  const parsed = parseJob(sampleJob());
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.error));
  return parsed.value;
}
const ids = (job: Job): string[] => job.cuts.map(({ id }) => id);
const isRight = (job: Job): boolean => parseJob(job).ok;

describe('frames', () => {
  const shapes: readonly Shape[] = [
    { type: 'rect', x: 1, y: 2, width: 30, height: 20, radius: 3, rotate: 0 },
    { type: 'ellipse', cx: 20, cy: 30, rx: 10, ry: 5, rotate: 0 },
    { type: 'path', d: 'M0 0 L10 0 L10 5 Z', fillRule: 'nonzero' },
    { type: 'path', d: 'M0 0 A5 5 0 0 1 10 0 L5 9 Z', fillRule: 'nonzero' },
    {
      type: 'points',
      at: [
        [1, 1],
        [5, 9],
      ],
    },
  ];
  it.each(shapes)('of $type: each figure that is set is the figure that is read', (shape) => {
    for (const change of [{ x: 7 }, { y: -3.5 }, { width: 12.7 }, { height: 4 }]) {
      const before = shapeFrame(shape, new Map())!;
      const after = shapeFrame(setShapeFrame(shape, change, new Map()), new Map())!;
      for (const key of ['x', 'y', 'width', 'height'] as const)
        expect(after[key]).toBeCloseTo({ ...before, ...change }[key], 3);
    }
  });

  it('of a turned rectangle are those before the turn, as the document has them', () => {
    const turned: Shape = { type: 'rect', x: 0, y: 0, width: 10, height: 4, radius: 0, rotate: 30 };
    expect(shapeFrame(turned, new Map())).toEqual({ x: 0, y: 0, width: 10, height: 4, angle: 30 });
  });

  it('turn a path about its middle by the typed angle', () => {
    const path: Shape = { type: 'path', d: 'M0 0 L10 0 L10 4 L0 4 Z', fillRule: 'nonzero' };
    const frame = shapeFrame(setShapeFrame(path, { angle: 90 }, new Map()), new Map())!;
    expect(frame.width).toBeCloseTo(4, 3);
    expect(frame.x).toBeCloseTo(3, 3);
  });
});

describe('cuts', () => {
  it('are made right, before the cut-out of their face, for every kind that a cutter can make', () => {
    for (const kind of [
      'pocket',
      'chamfer',
      'engrave',
      'taper-engrave',
      'drill',
      'bore',
      'surface',
      'profile',
    ] as const) {
      const added = addCut(sample(), kind, 'A', ['recess']);
      expect(added).not.toBeNull();
      expect(isRight(added!.job)).toBe(true);
      if (kind !== 'profile')
        expect(ids(added!.job).indexOf(added!.id)).toBeLessThan(ids(added!.job).indexOf('c3'));
    }
  });

  it('bring the other face into the order with its zero on the same physical corner', () => {
    const job = sample();
    const single: Job = { ...job, order: ['A'], setups: { A: job.setups.A }, cuts: job.cuts.slice(2) };
    const added = addCut(single, 'pocket', 'B', ['recess'])!;
    expect(added.job.order).toEqual(['A', 'B']);
    expect(added.job.setups.B?.zero.corner).toBe('back-left');
    expect(isRight(added.job)).toBe(true);
  });

  it('take one field, or say what is wrong with it', () => {
    expect(setCutField(sample(), 'c1', 'depth', 7.5)).toMatchObject({ ok: true });
    expect(setCutField(sample(), 'c3', 'tabs.height', 2)).toMatchObject({ ok: true });
    expect(setCutField(sample(), 'c1', 'depth', -1)).toEqual({
      ok: false,
      error: expect.stringMatching(/depth must be/),
    });
    expect(setCutField(sample(), 'c2', 'cutter', 'flat6')).toEqual({
      ok: false,
      error: expect.stringMatching(/needs a V-bit/),
    });
  });

  it('move among the cuts of their face only', () => {
    expect(ids(moveCut(sample(), 'c2', -1))).toEqual(['c2', 'c1', 'c3']);
    expect(ids(moveCut(sample(), 'c2', 1))).toEqual(['c1', 'c2', 'c3']);
  });

  it('are copied and deleted without leaving anything that leads nowhere', () => {
    expect(ids(duplicateCut(sample(), 'c1')!.job)).toEqual(['c1', 'pocket', 'c2', 'c3']);
    const rest = setCutField(duplicateCut(sample(), 'c1')!.job, 'pocket', 'rest', 'c1');
    if (!rest.ok) throw new Error(rest.error);
    expect(isRight(deleteCut(rest.value, 'c1'))).toBe(true);
  });
});

describe('outlines', () => {
  it('that are deleted take with them only what cannot be cut any more', () => {
    const job = deleteOutlines(sample(), ['part']);
    expect(ids(job)).toEqual(['c1']);
    expect(isRight(job)).toBe(true);
  });

  it('are copied with names and ids of their own', () => {
    const { job, ids: copies } = duplicateOutlines(sample(), ['part'], 10);
    expect(copies).toEqual(['rect']);
    expect(job.outlines.at(-1)).toMatchObject({ name: 'Part 2', shape: { x: 25, y: 5 } });
  });
});

describe('mends', () => {
  it('raise a fixed tab to auto, move a cut-out last, match zeros; each leaves a right document', () => {
    const low = setCutField(sample(), 'c3', 'tabs.height', 2);
    if (!low.ok) throw new Error(low.error);
    const early: Job = { ...sample(), cuts: [...sample().cuts.slice(2), ...sample().cuts.slice(0, 2)] };
    const zero = sample();
    const mismatched: Job = {
      ...zero,
      setups: { ...zero.setups, B: { ...zero.setups.B!, zero: { corner: 'front-left', z: 'surface' } } },
    };
    const cases: readonly [Job, Parameters<typeof mendsFor>[1], string][] = [
      [low.value, makeFinding('tab-without-wood', 'x', { cut: 'c3' }), 'Set the height to auto'],
      [early, makeFinding('cut-out-too-early', 'x', { cut: 'c3' }), 'Cut it out last'],
      [mismatched, makeFinding('turn-mismatch', 'x'), 'Zero face B at back-left'],
    ];
    for (const [job, finding, label] of cases) {
      const [mend] = mendsFor(job, finding);
      expect(mend?.label).toBe(label);
      expect(isRight(mend!.job)).toBe(true);
    }
  });
});
