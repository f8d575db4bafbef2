import { describe, expect, it } from 'vitest';
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
} from './planned';

const THROUGH = { kind: 'profile', face: 'A', cutter: 'flat6', depth: 'through' } as const;
const L_SHAPE = 'M20 20 H90 V50 H50 V80 H20 Z';
const L_POINTS = [
  [20, 20],
  [90, 20],
  [90, 50],
  [50, 50],
  [50, 80],
  [20, 80],
].map(([x, y]) => ({ x: x!, y: y! }));

describe('profile', () => {
  it('keeps the cutter exactly its radius from the part, corners rounded, and never inside', () => {
    const planned = plan([path('l', L_SHAPE)], [{ ...THROUGH, id: 'c', outlines: ['l'], side: 'outside' }]);
    const cutting = samples(stepOf(planned, 'c')).filter(({ z, rapid }) => z < -1 && !rapid);
    expect(cutting.length).toBeGreaterThan(1000);
    expect(cutting.filter((p) => inside(L_POINTS, p))).toEqual([]);
    expect(Math.max(...cutting.map((p) => Math.abs(distanceToPoints(L_POINTS, p) - 3)))).toBeLessThan(0.01);
    expect(rapidsBelow(planned)).toBe(0);
  });

  it('ends with a whole level lap at the floor: every place of the outline is passed there', () => {
    const planned = plan([path('l', L_SHAPE)], [{ ...THROUGH, id: 'c', outlines: ['l'], side: 'outside' }]);
    const floor = samples(stepOf(planned, 'c')).filter(({ z }) => Math.abs(z + 18.3) < 1e-9);
    for (let i = 0; i < L_POINTS.length; i++) {
      const a = L_POINTS[i]!;
      const b = L_POINTS[(i + 1) % L_POINTS.length]!;
      // Away from the reflex corner, which no round cutter reaches.
      for (const t of [0.15, 0.3, 0.5, 0.7, 0.85]) {
        const p = { x: a.x + (b.x - a.x) * t, y: a.y + (b.y - a.y) * t };
        expect(Math.min(...floor.map((q) => Math.hypot(q.x - p.x, q.y - p.y)))).toBeLessThan(3.01);
      }
    }
  });

  it.each([
    ['outside', 'climb', -1],
    ['outside', 'conventional', 1],
    ['inside', 'climb', 1],
    ['inside', 'conventional', -1],
  ] as const)(
    '%s %s runs in the right sense (climb keeps the wood on the right)',
    (side, direction, sign) => {
      const planned = plan(
        [rect('r', 40, 30, 60, 40)],
        [{ ...THROUGH, id: 'c', outlines: ['r'], side, direction }],
      );
      const floor = samples(stepOf(planned, 'c')).filter(({ z }) => Math.abs(z + 18.3) < 1e-9);
      const area = floor.reduce((sum, p, i) => {
        const q = floor[(i + 1) % floor.length]!;
        return sum + (p.x * q.y - q.x * p.y) / 2;
      }, 0);
      expect(Math.sign(area)).toBe(sign);
    },
  );

  it('cuts holes before the part that holds them', () => {
    const d = 'M20 20 H100 V80 H20 Z M40 35 V65 H80 V35 Z';
    const planned = plan([path('p', d)], [{ ...THROUGH, id: 'c', outlines: ['p'], side: 'outside' }]);
    const cutting = samples(stepOf(planned, 'c')).filter(({ z }) => z < -1);
    const isInHole = ({ x, y }: { x: number; y: number }) => x > 40 && x < 80 && y > 35 && y < 65;
    const firstOuter = cutting.findIndex((p) => !isInHole(p));
    expect(firstOuter).toBeGreaterThan(0);
    expect(cutting.slice(firstOuter).some(isInHole)).toBe(false);
  });

  it('leaves no slope behind with a ramp, and goes no deeper in a layer than the stepdown', () => {
    const planned = plan(
      [rect('r', 40, 30, 60, 40)],
      [{ ...THROUGH, id: 'c', outlines: ['r'], side: 'outside' }],
    );
    const counts = new Map<string, number>();
    for (const { z, rapid } of samples(stepOf(planned, 'c'))) {
      if (!rapid) counts.set(z.toFixed(4), (counts.get(z.toFixed(4)) ?? 0) + 1);
    }
    const levels = [...counts].filter(([, count]) => count > 1000).map(([level]) => level);
    // 18.3 mm in layers of at most 3 mm: seven of 18.3 / 7.
    expect(levels.map(Number).sort((a, b) => b - a)).toEqual(
      [1, 2, 3, 4, 5, 6, 7].map((i) => -Number(((18.3 * i) / 7).toFixed(4))),
    );
  });

  it('says so where an opening is narrower than the cutter', () => {
    const planned = plan(
      [rect('slot', 40, 40, 50, 5)],
      [{ ...THROUGH, id: 'c', outlines: ['slot'], side: 'inside' }],
    );
    expect(planned.findings).toMatchObject([
      { code: 'cutter-too-large', severity: 'error', cut: 'c', face: 'A' },
    ]);
    expect(planned.steps).toEqual([]);
  });

  it('runs on the line as drawn, open or closed', () => {
    const planned = plan(
      [path('o', 'M20 20 L60 20 L60 50')],
      [{ ...THROUGH, id: 'c', outlines: ['o'], side: 'on', depth: 3, entry: { type: 'plunge' } }],
    );
    const { moves } = stepOf(planned, 'c');
    expect(
      moves.filter(({ kind }) => kind === 'feed').map((move) => ('to' in move ? move.to : null)),
    ).toEqual([
      { x: 20, y: 20, z: -3 },
      { x: 60, y: 20, z: -3 },
      { x: 60, y: 50, z: -3 },
    ]);
  });

  it('keeps a skin at the far face', () => {
    const planned = plan(
      [rect('r', 40, 30, 60, 40)],
      [{ ...THROUGH, id: 'c', outlines: ['r'], side: 'outside', skin: 0.4 }],
    );
    expect(Math.min(...samples(stepOf(planned, 'c')).map(({ z }) => z))).toBeCloseTo(-17.6, 9);
  });

  it('takes an allowance off with one last pass when asked to finish', () => {
    const planned = plan(
      [rect('r', 40, 30, 60, 40)],
      [{ ...THROUGH, id: 'c', outlines: ['r'], side: 'outside', allowance: 0.5, finish: true }],
    );
    const ring = [
      { x: 40, y: 30 },
      { x: 100, y: 30 },
      { x: 100, y: 70 },
      { x: 40, y: 70 },
    ];
    const near = samples(stepOf(planned, 'c')).filter((p) => p.z < -1 && distanceToPoints(ring, p) < 3.25);
    expect(near.length).toBeGreaterThan(500);
    expect(near.every(({ z }) => z <= -18.3 + 1e-9 || z > -18.3)).toBe(true);
    expect(near.filter(({ z }) => Math.abs(z + 18.3) < 1e-6).length).toBeGreaterThan(500);
    expect(cutterOfCut(planned.job, { cutter: 'flat6' }).diameter).toBe(6);
  });

  it.each([
    ['line', 'outside', 'climb'],
    ['arc', 'outside', 'climb'],
    ['arc', 'outside', 'conventional'],
    ['line', 'inside', 'climb'],
    ['arc', 'inside', 'conventional'],
  ] as const)('comes in by a %s in the waste, %s, %s', (type, side, direction) => {
    const planned = plan(
      [path('l', L_SHAPE)],
      [{ ...THROUGH, id: 'c', outlines: ['l'], side, direction, lead: { type, length: 4 } }],
    );
    const run = samples(stepOf(planned, 'c')).filter(({ z, rapid }) => z < -1e-6 && !rapid);
    expect(Math.min(...run.map((p) => distanceToPoints(L_POINTS, p)))).toBeGreaterThan(2.98);
    expect(run.every((p) => inside(L_POINTS, p) === (side === 'inside'))).toBe(true);
    // The ramps lie off the line: on the line itself every place is at a layer's depth.
    const layers = [1, 2, 3, 4, 5, 6, 7].map((i) => -(18.3 * i) / 7);
    const offLayer = run.filter(
      (p) => distanceToPoints(L_POINTS, p) < 3.05 && !layers.some((z) => Math.abs(z - p.z) < 1e-6),
    );
    expect(offLayer).toEqual([]);
    expect(run.some((p) => distanceToPoints(L_POINTS, p) > 6)).toBe(true);
  });

  it('relieves the inner corners of a part and of a hole', () => {
    const outside = plan(
      [path('l', L_SHAPE)],
      [{ ...THROUGH, id: 'c', outlines: ['l'], side: 'outside', relief: 'dogbone' }],
    );
    const run = samples(stepOf(outside, 'c'), 0.05).filter(({ z }) => z < -18);
    const fromNotch = run.map(({ x, y }) => Math.hypot(x - 50, y - 50));
    expect(Math.min(...fromNotch)).toBeCloseTo(3, 2);
    const plain = plan([path('l', L_SHAPE)], [{ ...THROUGH, id: 'c', outlines: ['l'], side: 'outside' }]);
    const kept = samples(stepOf(plain, 'c'), 0.05).filter(({ z }) => z < -18);
    expect(Math.min(...kept.map(({ x, y }) => Math.hypot(x - 50, y - 50)))).toBeCloseTo(3 * Math.SQRT2, 2);
  });
});
