import { describe, expect, it } from 'vitest';
import type { JobInput } from '@/lib/job/job-schema';
import type { Vec } from '@/lib/geometry/vec';
import { sampleJob } from '../helpers/sample-job';
import {
  cutterOfCut,
  distanceToPoints,
  inside,
  path,
  plan,
  rapidsBelow,
  samples,
  woodAt,
  type CutInput,
} from './planned';

const V60: JobInput['cutters'][number] = {
  ...sampleJob().cutters[1]!,
  id: 'v60wide',
  number: 8,
  diameter: 20,
} as JobInput['cutters'][number];
const FLAT1 = {
  ...sampleJob().cutters[0]!,
  id: 'flat1',
  number: 6,
  diameter: 1,
} as JobInput['cutters'][number];
const cutters = { cutters: [...sampleJob().cutters, V60, FLAT1] };
const TAPER: CutInput = {
  kind: 'taper-engrave',
  id: 't',
  face: 'A',
  outlines: ['a'],
  cutter: 'v60wide',
  depth: 15,
  stepdown: 20,
};

/** Over- and undercut against min(distance / tan α, depth) on a grid: greatest overcut, mean and 95th percentile left. */
function compare(d: string, corners: readonly Vec[], depth: number, change: object = {}) {
  const planned = plan([path('a', d)], [{ ...TAPER, depth, ...change } as CutInput], cutters);
  const slope = Math.tan(Math.PI / 6);
  const left: number[] = [];
  let overcut = 0;
  const runs = planned.steps.map((step) => ({
    cutter: cutterOfCut(planned.job, { cutter: step.cutter }),
    run: samples(step, 0.05).filter(({ z }) => z < 0),
  }));
  const xs = corners.map(({ x }) => x);
  const ys = corners.map(({ y }) => y);
  for (let x = Math.min(...xs) - 0.6; x < Math.max(...xs) + 0.6; x += 0.43) {
    // A cutter reaches no further than its radius or, with a point, the width of its cut.
    const columns = runs.map(({ run, cutter }) => {
      const reach = cutter.kind === 'vbit' ? depth * slope + 0.1 : cutter.diameter / 2;
      return { cutter, run: run.filter((sample) => Math.abs(sample.x - x) <= Math.min(reach, 10)) };
    });
    for (let y = Math.min(...ys) - 0.6; y < Math.max(...ys) + 0.6; y += 0.41) {
      const p = { x, y };
      const room = inside(corners, p) ? distanceToPoints(corners, p) : 0;
      const asked = Math.min(room / slope, depth);
      const found = -Math.min(...columns.map(({ run, cutter }) => woodAt(run, cutter, p)));
      overcut = Math.max(overcut, found - asked);
      if (room > 0) left.push(asked - found);
    }
  }
  left.sort((a, b) => a - b);
  const mean = left.reduce((sum, v) => sum + v, 0) / left.length;
  return { planned, overcut, mean, p95: left[Math.floor(left.length * 0.95)]! };
}

const STAR = Array.from({ length: 10 }, (_, i) => {
  const r = i % 2 === 0 ? 9 : 4;
  const angle = Math.PI / 2 + (i * Math.PI) / 5;
  return { x: 60 + r * Math.cos(angle), y: 50 + r * Math.sin(angle) };
});
const T_SHAPE = [
  [50, 40],
  [56, 40],
  [56, 54],
  [64, 54],
  [64, 60],
  [42, 60],
  [42, 54],
  [50, 54],
].map(([x, y]) => ({ x: x!, y: y! }));
const data = (points: readonly Vec[]) => `M${points.map(({ x, y }) => `${x} ${y}`).join(' L')} Z`;

describe('taper-engrave', () => {
  it.each([
    { name: 'a star', corners: STAR },
    { name: 'a letter T', corners: T_SHAPE },
  ])(
    'cuts $name to its sides, up into every corner (overcut ≤ 0.02, mean ≤ 0.01, 95 % ≤ 0.03)',
    ({ corners }) => {
      const { overcut, mean, p95, planned } = compare(data(corners), corners, 15);
      expect(overcut).toBeLessThan(0.02);
      expect(mean).toBeLessThan(0.01);
      expect(p95).toBeLessThan(0.03);
      expect(rapidsBelow(planned)).toBe(0);
    },
  );

  it('runs along the ridge of a rectangle at r / tan α (check value C014: 40 × 20, 60°: 17.3205)', () => {
    const planned = plan([path('a', 'M40 40 H80 V60 H40 Z')], [{ ...TAPER, depth: 30 } as CutInput], cutters);
    const deepest = Math.min(...samples(planned.steps[0]!).map(({ z }) => z));
    expect(deepest).toBeCloseTo(-17.3205, 2);
  });

  it('stops at the depth limit and clears the flat floor, with the V-bit alone or after a flat cutter', () => {
    const alone = compare(data(T_SHAPE), T_SHAPE, 2);
    expect(alone.overcut).toBeLessThan(0.02);
    // Ridges of the V-bit's own passes: stepover · D / (2 tan α) = 0.1 · 20 / (2 · 0.577).
    expect(alone.p95).toBeLessThan(1.74);
    const fine = compare(data(T_SHAPE), T_SHAPE, 1, { floor: 'flat1' });
    expect(fine.planned.steps.map(({ cutter }) => cutter)).toEqual(['flat1', 'v60wide']);
    expect(fine.overcut).toBeLessThan(0.02);
    expect(fine.mean).toBeLessThan(0.02);
  });
});
