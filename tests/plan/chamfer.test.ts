import { describe, expect, it } from 'vitest';
import type { Cutter } from '@/lib/job/machine-schema';
import { bevelPath } from '@/lib/plan/kinds/chamfer';
import {
  cutterOfCut,
  distanceToPoints,
  inside,
  path,
  plan,
  rapidsBelow,
  rect,
  samples,
  stepOf,
  woodAt,
} from './planned';

const BEVEL = { kind: 'chamfer', id: 'c', face: 'A', cutter: 'v60', width: 2, beneath: 0.5 } as const;

function vbit(angle: number, tip = 0): Extract<Cutter, { kind: 'vbit' }> {
  const speeds = { rpm: 1, feed: 1, plunge: 1, stepdown: 1, stepover: 0.1 };
  const common = {
    id: 'v',
    number: 1,
    name: 'v',
    diameter: 12,
    flutes: 2,
    fluteLength: 9,
    reach: 9,
    shank: 6,
  };
  return { ...common, centreCutting: true, speeds, kind: 'vbit', angle, tip };
}

describe('bevelPath', () => {
  // Check values C017, C018, C019 (elementary geometry).
  it.each([
    [90, 0, 2, 0.5, 2.5, 0.5],
    [60, 0, 2, 0.5, 3.9641, 0.2887],
    [90, 0.3, 2, 0.5, 2.5, 0.65],
    [90, 0.3, 2, 0, 2, 0.15],
  ])(
    '%s°, flat %s, width %s, beneath %s: depth %s, offset %s',
    (angle, tip, width, beneath, depth, offset) => {
      const bevel = bevelPath(vbit(angle, tip), width, beneath);
      expect(bevel.depth).toBeCloseTo(depth, 4);
      expect(bevel.offset).toBeCloseTo(offset, 4);
    },
  );
});

describe('chamfer', () => {
  const notch = 'M20 20 H100 V80 H70 V50 H50 V80 H20 Z';
  const corners = [
    [20, 20],
    [100, 20],
    [100, 80],
    [70, 80],
    [70, 50],
    [50, 50],
    [50, 80],
    [20, 80],
  ].map(([x, y]) => ({ x: x!, y: y! }));

  it('bevels the wood within the outline by its width, ± 0.02, and takes no more in reflex corners', () => {
    const planned = plan([path('p', notch)], [{ ...BEVEL, outlines: ['p'], side: 'outside' }]);
    const run = samples(stepOf(planned, 'c'), 0.05).filter(({ z }) => z < 0);
    const cutter = cutterOfCut(planned.job, { cutter: 'v60' });
    const slope = Math.tan(Math.PI / 6);
    let worstGouge = 0;
    let worstLeft = 0;
    for (let x = 20.25; x < 100; x += 1.1) {
      for (let y = 20.25; y < 80; y += 1.1) {
        const p = { x, y };
        if (!inside(corners, p)) continue;
        const room = distanceToPoints(corners, p);
        const near = run.filter((q) => Math.abs(q.x - x) < 4 && Math.abs(q.y - y) < 4);
        const asked = Math.max(0, (2 - room) / slope);
        const found = -woodAt(near, cutter, p);
        worstGouge = Math.max(worstGouge, found - asked);
        // Corners that point into the part cannot be reached by a cone; straight edges must be right.
        const fromCorner = Math.min(...corners.map((c) => Math.hypot(c.x - x, c.y - y)));
        if (fromCorner > 4) worstLeft = Math.max(worstLeft, asked - found);
      }
    }
    expect(worstGouge * slope).toBeLessThan(0.02);
    expect(worstLeft * slope).toBeLessThan(0.02);
    expect(rapidsBelow(planned)).toBe(0);
  });

  it('bevels the wood beyond the outline for inside', () => {
    const planned = plan([rect('r', 40, 30, 60, 40)], [{ ...BEVEL, outlines: ['r'], side: 'inside' }]);
    const cutter = cutterOfCut(planned.job, { cutter: 'v60' });
    const run = samples(stepOf(planned, 'c'), 0.05).filter(({ z }) => z < 0);
    expect(woodAt(run, cutter, { x: 39, y: 50 })).toBeCloseTo(-1 / Math.tan(Math.PI / 6), 2);
    expect(woodAt(run, cutter, { x: 37.97, y: 50 })).toBe(0);
  });

  it('refuses a V-bit that is too narrow at the face', () => {
    const planned = plan(
      [rect('r', 40, 30, 60, 40)],
      [{ ...BEVEL, outlines: ['r'], side: 'outside', width: 2.8 }],
    );
    expect(planned.findings).toMatchObject([{ code: 'cutter-too-small', severity: 'error' }]);
    expect(planned.steps).toEqual([]);
  });

  it('starts below the face where asked, in one pass unless a stepdown is given', () => {
    const one = plan([rect('r', 40, 30, 60, 40)], [{ ...BEVEL, outlines: ['r'], side: 'outside', start: 1 }]);
    const deepest = Math.min(...samples(stepOf(one, 'c')).map(({ z }) => z));
    expect(deepest).toBeCloseTo(-(1 + 3.9641), 3);
    const many = plan(
      [rect('r', 40, 30, 60, 40)],
      [{ ...BEVEL, outlines: ['r'], side: 'outside', stepdown: 2 }],
    );
    const passes = (planned: typeof one) =>
      stepOf(planned, 'c').moves.filter(({ kind }) => kind === 'arc').length;
    expect(passes(many)).toBe(2 * passes(one));
  });

  it('says so where a hole is too narrow for the point to stand clear of its walls', () => {
    const d = 'M20 20 H100 V80 H20 Z M40 40 V40.4 H60 V40 Z';
    const planned = plan([path('p', d)], [{ ...BEVEL, outlines: ['p'], side: 'outside' }]);
    expect(planned.findings).toMatchObject([{ code: 'cutter-too-large', cut: 'c', face: 'A' }]);
    expect(planned.steps).toHaveLength(1);
  });
});
