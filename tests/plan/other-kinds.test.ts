import { describe, expect, it } from 'vitest';
import type { JobInput } from '@/lib/job/job-schema';
import { boreRings } from '@/lib/plan/kinds/bore';
import { sampleJob } from '../helpers/sample-job';
import {
  cutterOfCut,
  path,
  plan,
  rapidsBelow,
  rect,
  samples,
  stepOf,
  woodAt,
  type CutInput,
  type OutlineInput,
} from './planned';

const DRILL: JobInput['cutters'][number] = {
  id: 'drill5',
  number: 9,
  name: '5 mm drill',
  kind: 'drill',
  diameter: 5,
  angle: 118,
  fluteLength: 40,
  reach: 40,
  shank: 5,
  speeds: { rpm: 8000, feed: 300, plunge: 300, stepdown: 5, stepover: 0.5 },
};
const withDrill = { cutters: [...sampleJob().cutters, DRILL] };

describe('engrave', () => {
  it('follows lines and arcs exactly, at depth, in layers, in both directions where open', () => {
    const planned = plan(
      [path('l', 'M20 20 H60 A10 10 0 0 1 60 40')],
      [{ kind: 'engrave', id: 'e', face: 'A', outlines: ['l'], cutter: 'v60', depth: 3 }],
    );
    const feeds = stepOf(planned, 'e').moves.filter(({ kind }) => kind === 'feed' || kind === 'arc');
    expect(feeds.map((move) => ('to' in move ? move.to.z : 0))).toEqual([-1.5, -1.5, -1.5, -3, -3, -3]);
    expect(feeds.filter(({ kind }) => kind === 'arc')).toMatchObject([
      { cx: 60, cy: 30, ccw: true, to: { x: 60, y: 40 } },
      { cx: 60, cy: 30, ccw: false, to: { x: 60, y: 20 } },
    ]);
  });

  it('takes the lines in an order of little travel', () => {
    const lines = [0, 5, 1, 4, 2, 3].map((i) => `M${20 + i * 20} 20 v40`).join(' ');
    const planned = plan(
      [path('l', lines)],
      [{ kind: 'engrave', id: 'e', face: 'A', outlines: ['l'], cutter: 'v60', depth: 1 }],
    );
    const travel = stepOf(planned, 'e')
      .moves.flatMap((move) => (move.kind === 'rapid' && move.to.z === 6 ? [move.to] : []))
      .reduce(
        (sum, p, i, all) => sum + (i > 0 ? Math.hypot(p.x - all[i - 1]!.x, p.y - all[i - 1]!.y) : 0),
        0,
      );
    // Five gaps of 20 mm; the retracts stand over line ends.
    expect(travel).toBeLessThan(5 * 20 + 6 * 40 + 1);
  });
});

describe('drill', () => {
  const points: OutlineInput = {
    id: 'h',
    face: 'A',
    shape: {
      type: 'points',
      at: [
        [20, 20],
        [60, 30],
      ],
    },
  };

  it('pecks and dwells at points', () => {
    const cut: CutInput = {
      kind: 'drill',
      id: 'd',
      face: 'A',
      outlines: ['h'],
      cutter: 'drill5',
      depth: 12,
      peck: 5,
      dwell: 0.5,
    };
    const planned = plan([points], [cut], withDrill);
    const { moves } = stepOf(planned, 'd');
    expect(moves.filter(({ kind }) => kind === 'feed').map((m) => ('to' in m ? m.to.z : 0))).toEqual([
      -5, -10, -12, -5, -10, -12,
    ]);
    expect(moves.filter(({ kind }) => kind === 'dwell')).toEqual([
      { kind: 'dwell', seconds: 0.5 },
      { kind: 'dwell', seconds: 0.5 },
    ]);
    expect(rapidsBelow(planned)).toBe(0);
  });

  it('goes through by the length of its point and what it is asked to go beneath', () => {
    const planned = plan(
      [points],
      [
        {
          kind: 'drill',
          id: 'd',
          face: 'A',
          outlines: ['h'],
          cutter: 'drill5',
          depth: 'through',
          below: 0.2,
        },
      ],
      withDrill,
    );
    const point = 2.5 / Math.tan((59 * Math.PI) / 180);
    const deepest = Math.min(...samples(stepOf(planned, 'd')).map(({ z }) => z));
    expect(deepest).toBeCloseTo(-(18 + 0.2 + point), 9);
  });

  it('drills at the centroids of closed outlines', () => {
    const planned = plan(
      [rect('r', 40, 30, 20, 10), path('t', 'M100 20 h30 v30 z')],
      [{ kind: 'drill', id: 'd', face: 'A', outlines: ['r', 't'], cutter: 'drill5', depth: 3 }],
      withDrill,
    );
    const bottoms = samples(stepOf(planned, 'd')).filter(({ z }) => z === -3);
    expect(bottoms.map(({ x, y }) => [x, y].map((v) => Math.round(v * 1000) / 1000))).toEqual([
      [50, 35],
      [120, 30],
    ]);
  });
});

describe('bore', () => {
  it.each([7, 12, 15, 40])('clears a hole of %s mm whole, its wall within 0.01 of round', (diameter) => {
    const hole: OutlineInput = {
      id: 'h',
      face: 'A',
      shape: { type: 'ellipse', cx: 60, cy: 50, rx: diameter / 2, ry: diameter / 2 },
    };
    const planned = plan(
      [hole],
      [{ kind: 'bore', id: 'b', face: 'A', outlines: ['h'], cutter: 'flat6', depth: 8, pitch: 2 }],
    );
    const all = samples(stepOf(planned, 'b'), 0.05).filter(({ z }) => z < -1e-9);
    const reach = Math.max(...all.map(({ x, y }) => Math.hypot(x - 60, y - 50)));
    expect(reach + 3).toBeCloseTo(diameter / 2, 3);
    const floor = all.filter(({ z }) => z === -8);
    const angles = new Set(
      floor
        .filter(({ x, y }) => Math.hypot(x - 60, y - 50) > reach - 0.005)
        .map(({ x, y }) => Math.round((Math.atan2(y - 50, x - 60) * 18) / Math.PI)),
    );
    expect(angles.size).toBeGreaterThanOrEqual(36);
    const cutter = cutterOfCut(planned.job, { cutter: 'flat6' });
    for (let r = 0; r < diameter / 2 - 0.05; r += 0.37) {
      expect(woodAt(floor, cutter, { x: 60 + r, y: 50 })).toBe(-8);
    }
  });

  it('in rings from inside out, each overlapping the one before', () => {
    expect(boreRings(3, 3, 2.7)).toEqual([]);
    expect(boreRings(5, 3, 2.7)).toEqual([2]);
    const rings = boreRings(20, 3, 2.7);
    expect(rings[0]).toBeLessThan(3);
    expect(rings.at(-1)).toBe(17);
    rings.slice(1).forEach((ring, i) => expect(ring - rings[i]!).toBeLessThanOrEqual(2.7 + 1e-9));
  });

  it('does not fit into a hole narrower than the cutter', () => {
    const hole: OutlineInput = {
      id: 'h',
      face: 'A',
      shape: { type: 'ellipse', cx: 60, cy: 50, rx: 2.9, ry: 2.9 },
    };
    const planned = plan(
      [hole],
      [{ kind: 'bore', id: 'b', face: 'A', outlines: ['h'], cutter: 'flat6', depth: 8 }],
    );
    expect(planned.findings).toMatchObject([{ code: 'cutter-too-large', at: [60, 50] }]);
    expect(planned.steps).toEqual([]);
  });
});

describe('surface', () => {
  it.each([0, 30, 90])('planes the whole board at %s° and runs out all round by r + 1 mm', (angle) => {
    const planned = plan(
      [],
      [
        {
          kind: 'surface',
          id: 's',
          face: 'A',
          outlines: [],
          cutter: 'flat6',
          depth: 0.5,
          angle,
          stepover: 0.6,
        },
      ],
    );
    const run = samples(stepOf(planned, 's'), 0.5).filter(({ z }) => z === -0.5);
    const cutter = cutterOfCut(planned.job, { cutter: 'flat6' });
    let highest = -1;
    for (let x = 0; x <= 200; x += 9.7) {
      for (let y = 0; y <= 100; y += 9.3) highest = Math.max(highest, woodAt(run, cutter, { x, y }));
    }
    expect(highest).toBe(-0.5);
    expect(Math.min(...run.map(({ x }) => x))).toBeGreaterThanOrEqual(-4.01);
    expect(Math.max(...run.map(({ y }) => y))).toBeLessThanOrEqual(104.01);
  });
});

describe('following a measured surface', () => {
  const line: CutInput = { kind: 'engrave', id: 'e', face: 'A', outlines: ['l'], cutter: 'v60', depth: 0.5 };
  const board = (surface: unknown) =>
    ({ board: { x: 200, y: 100, z: 18, surface: { A: surface } } }) as Partial<JobInput>;

  it('moves each z by the parabola through three readings across the board', () => {
    const cup = { kind: 'cup', across: 'y', readings: [0, -0.4, 0.2] };
    const planned = plan([path('l', 'M50 0 V100')], [line], board(cup));
    const run = samples(stepOf(planned, 'e'), 0.25).filter(({ rapid, z }) => !rapid && z < 0.1);
    const height = (t: number) => 2 * (-0.4 * -2 * t * (t - 1)) + 0.2 * t * (2 * t - 1);
    const errors = run.slice(1).map(({ y, z }) => Math.abs(z + 0.5 - height(y / 100)));
    expect(height(0.5)).toBeCloseTo(-0.4, 12);
    expect(Math.max(...errors.slice(10))).toBeLessThan(0.02);
    // A hollow never lowers a rapid.
    const rapids = stepOf(planned, 'e').moves.filter(({ kind }) => kind === 'rapid');
    expect(Math.min(...rapids.map((move) => ('to' in move ? move.to.z : 99)))).toBeGreaterThanOrEqual(1.5);
  });

  it('is exact at the nodes of a grid, bilinear between and level beyond', () => {
    const grid = {
      kind: 'grid',
      x: [50, 150],
      y: [20, 80],
      z: [
        [0, 1],
        [0.5, -0.5],
      ],
    };
    const planned = plan(
      [path('l', 'M0 20 H200'), path('m', 'M100 50 V80')],
      [{ ...line, outlines: ['l', 'm'] }],
      board(grid),
    );
    const run = samples(stepOf(planned, 'e'), 0.05).filter(({ rapid }) => !rapid);
    const at = (x: number, y: number) =>
      run.reduce((best, p) =>
        Math.hypot(p.x - x, p.y - y) + Math.max(0, p.z) <
        Math.hypot(best.x - x, best.y - y) + Math.max(0, best.z)
          ? p
          : best,
      );
    expect(at(20, 20).z).toBeCloseTo(-0.5, 2);
    expect(at(100, 20).z).toBeCloseTo(0, 1);
    expect(at(100, 80).z).toBeCloseTo(-0.5, 2);
  });
});
