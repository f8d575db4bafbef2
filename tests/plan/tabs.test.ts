import { describe, expect, it } from 'vitest';
import type { CutInput } from './planned';
import { path, plan, rect, samples, stepOf } from './planned';

const BOARD = 18;
type Tabs = NonNullable<Extract<CutInput, { kind: 'profile' }>['tabs']>;

function cutOut(tabs: Tabs, more: object = {}): CutInput {
  return {
    kind: 'profile',
    id: 'cut-out',
    face: 'A',
    outlines: ['part'],
    cutter: 'flat6',
    side: 'outside',
    depth: 'through',
    tabs,
    ...more,
  };
}

const FIXED: Tabs = { length: 6, height: 3, placement: { type: 'count', count: 4 } };
const PART = rect('part', 15, 15, 160, 70);

/** Lengths along the last lap on which the cutter runs at or above a height. */
function heldUp(planned: ReturnType<typeof plan>, z: number): number[] {
  const step = 0.02;
  const all = samples(stepOf(planned, 'cut-out'), step);
  const floor = all.reduce((low, p) => Math.min(low, p.z), 0);
  const first = all.findIndex((p) => p.z <= floor + 1e-9);
  const runs: number[] = [];
  let run = 0;
  let before = all[first]!;
  for (const p of all.slice(first)) {
    if (p.rapid) break;
    const moved = Math.hypot(p.x - before.x, p.y - before.y);
    if (p.z >= z - 1e-6) run += moved;
    else if (run > 0) {
      runs.push(run);
      run = 0;
    }
    before = p;
  }
  if (run > 0) runs.push(run);
  return runs.filter((length) => length > 0.05);
}

describe('tabs', () => {
  it('hold the path up for length + cutter diameter on the straight (check value C098: l = 6, D = 6: 12 mm)', () => {
    const runs = heldUp(plan([PART], [cutOut(FIXED)]), -(BOARD - 3));
    expect(runs).toHaveLength(4);
    for (const run of runs) expect(run).toBeCloseTo(12, 1);
  });

  it('have their top at −(T − h) (check value C101) and lift no layer above it', () => {
    const planned = plan([PART], [cutOut(FIXED)]);
    const zs = samples(stepOf(planned, 'cut-out')).map(({ z }) => z);
    expect(zs.some((z) => Math.abs(z + 15) < 1e-9)).toBe(true);
    expect(planned.tabs.map(({ height }) => height)).toEqual([3, 3, 3, 3]);
  });

  it('slope by the angle asked for (check value C100: h = 3, 45°: 12 + 6 = 18 mm in all, 12 mm at full height)', () => {
    const planned = plan([PART], [cutOut({ ...FIXED, slope: 45 }, { below: 0 })]);
    for (const run of heldUp(planned, -15)) expect(run).toBeCloseTo(12, 1);
    for (const run of heldUp(planned, -18 + 0.001)) expect(run).toBeCloseTo(18, 1);
  });

  it('stand evenly, on straight places, apart from corners', () => {
    const planned = plan([PART], [cutOut(FIXED)]);
    const perimeter = 2 * (160 + 70);
    const gap = 1 / 4;
    planned.tabs.forEach(({ fraction, at }, i) => {
      expect(Math.abs(fraction - (i + 0.5) * gap)).toBeLessThanOrEqual(gap / 4 + 1e-9);
      const [x, y] = at;
      const corner = Math.min(...[15, 175].flatMap((cx) => [15, 85].map((cy) => Math.hypot(x - cx, y - cy))));
      expect(corner).toBeGreaterThanOrEqual(6 - 1e-6);
    });
    expect(perimeter).toBe(460);
  });

  it('by spacing: length / spacing rounded half up, at least two, for every contour that is cut through', () => {
    const d = 'M15 15 H175 V85 H15 Z M40 40 V60 H90 V40 Z';
    const spaced = (spacing: number) =>
      plan([path('part', d)], [cutOut({ length: 4, height: 3, placement: { type: 'spacing', spacing } })])
        .tabs;
    const count = (tabs: ReturnType<typeof spaced>, contour: number) =>
      tabs.filter((tab) => tab.contour === contour).length;
    // 460 / 100 = 4.6 → 5; 140 / 100 = 1.4 → 1, at least 2.
    expect([count(spaced(100), 0), count(spaced(100), 1)]).toEqual([5, 2]);
    // 460 / 184 = 2.5 → 3.
    expect(count(spaced(184), 0)).toBe(3);
  });

  it('given by fraction stand exactly there, corners or not', () => {
    const at = [
      { outline: 'part', contour: 0, fraction: 0 },
      { outline: 'part', contour: 0, fraction: 0.5 },
    ];
    const planned = plan([PART], [cutOut({ length: 4, height: 3, placement: { type: 'at', at } })]);
    expect(planned.tabs.map(({ at: place }) => place)).toEqual([
      [15, 15],
      [175, 85],
    ]);
  });

  it('that do not fit twice are left out altogether', () => {
    const small = {
      id: 'part',
      face: 'A',
      shape: { type: 'ellipse', cx: 60, cy: 50, rx: 2, ry: 2 },
    } as const;
    expect(plan([small], [cutOut({ ...FIXED, length: 12 })]).tabs).toEqual([]);
    // π · 2 · (2 + 3) = 31.4 mm of path: two of 4 + 6 mm, not four.
    expect(plan([small], [cutOut({ ...FIXED, length: 4 })]).tabs).toHaveLength(3);
  });

  it('rise automatically over the far chamfer (check value C166: w = 2, c = 0.5, h = 1.5, 60°: 5.4641 mm)', () => {
    const chamfer: CutInput = {
      kind: 'chamfer',
      id: 'bevel',
      face: 'B',
      outlines: ['part'],
      cutter: 'v60',
      side: 'outside',
      width: 2,
      beneath: 0.5,
    };
    const auto = { ...FIXED, height: 'auto', hold: 1.5 } as const;
    const planned = plan([PART], [chamfer, cutOut(auto)]);
    for (const tab of planned.tabs) expect(tab.height).toBeCloseTo(5.4641, 3);
    // The same whichever face is cut first.
    const other = plan([PART], [chamfer, cutOut(auto)], { order: ['A', 'B'] });
    for (const tab of other.tabs) expect(tab.height).toBeCloseTo(5.4641, 3);
  });

  it('rise only where the far face is cut: each tab by its own footprint', () => {
    const pocket: CutInput = {
      kind: 'pocket',
      id: 'dado',
      face: 'B',
      outlines: ['dado'],
      cutter: 'flat6',
      depth: 7,
    };
    const dado = rect('dado', 0, 40, 30, 20, 'B');
    const at = [
      { outline: 'part', contour: 0, fraction: (160 + 70 + 160 + 35) / 460 },
      { outline: 'part', contour: 0, fraction: 80 / 460 },
    ];
    const planned = plan(
      [PART, dado],
      [pocket, cutOut({ length: 6, height: 'auto', hold: 2, placement: { type: 'at', at } })],
    );
    expect(planned.tabs.map(({ height }) => height)).toEqual([9, 2]);
  });
});
