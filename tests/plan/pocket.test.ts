import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec } from '@/lib/geometry/vec';
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
  type CutInput,
  type OutlineInput,
  type Planned,
} from './planned';

const POCKET = { kind: 'pocket', id: 'p', face: 'A', cutter: 'flat6', depth: 3 } as const;
/** The sampled distance field below is only as fine as its grid, mm. */
const GRID = 0.5;

/**
 * Checks a pocket of straight-sided rings against brute force: no place of the cutter's axis nearer than r to a wall or
 * outside; and every grid point that some disc of radius r within the area covers is cut to the floor. The opening is
 * worked out on a finer grid of its own: axis places are those at least r from every wall.
 */
function checkPocket(planned: Planned, rings: readonly Vec[][], depth: number, radius = 3): void {
  const within = (p: Vec) => rings.reduce((odd, ring) => odd !== inside(ring, p), false);
  const wall = (p: Vec) => Math.min(...rings.map((ring) => distanceToPoints(ring, p)));
  const cutting = samples(stepOf(planned, 'p'), 0.2).filter(({ z, rapid }) => !rapid && z < -1e-9);
  expect(cutting.filter((p) => !within(p))).toEqual([]);
  expect(Math.min(...cutting.map(wall))).toBeGreaterThan(radius - 0.02);
  expect(Math.min(...cutting.map(({ z }) => z))).toBeGreaterThanOrEqual(-depth - 1e-9);
  const floor = cutting.filter(({ z }) => z < -depth + 0.01);
  const cutter = cutterOfCut(planned.job, { cutter: 'flat6' });
  const xs = rings.flat().map(({ x }) => x);
  const ys = rings.flat().map(({ y }) => y);
  const axisPlaces: Vec[] = [];
  for (let x = Math.min(...xs); x <= Math.max(...xs); x += GRID) {
    for (let y = Math.min(...ys); y <= Math.max(...ys); y += GRID) {
      const p = { x, y };
      if (within(p) && wall(p) >= radius) axisPlaces.push(p);
    }
  }
  // Some axis places' own points and points of their discs: all of them must be cut.
  const highest = axisPlaces.reduce((most, p, i) => {
    const angle = i * 2.399;
    const rim = { x: p.x + 0.98 * radius * Math.cos(angle), y: p.y + 0.98 * radius * Math.sin(angle) };
    if (i % 7 === 0) return Math.max(most, woodAt(floor, cutter, rim));
    return i % 11 === 0 ? Math.max(most, woodAt(floor, cutter, p)) : most;
  }, -Infinity);
  if (axisPlaces.length > 0) expect(highest).toBeLessThan(-depth + 0.01);
}

function ringOf(...at: [number, number][]): Vec[] {
  return at.map(([x, y]) => ({ x, y }));
}

function polygon(id: string, ring: readonly Vec[]): OutlineInput {
  return path(id, `M${ring.map(({ x, y }) => `${x} ${y}`).join(' L')} Z`);
}

const BOX = ringOf([40, 30], [80, 30], [80, 60], [40, 60]);
const DUMBBELL = ringOf(
  [20, 20],
  [45, 20],
  [45, 33],
  [60, 33],
  [60, 20],
  [85, 20],
  [85, 50],
  [60, 50],
  [60, 41],
  [45, 41],
  [45, 50],
  [20, 50],
);

describe('pocket', () => {
  it.each([0.2, 0.45, 0.6, 0.95])('clears all that the cutter can reach at a step-over of %s', (stepover) => {
    checkPocket(plan([polygon('a', BOX)], [{ ...POCKET, outlines: ['a'], stepover }]), [BOX], 3);
  });

  it('clears two chambers through their neck', () => {
    const planned = plan([polygon('a', DUMBBELL)], [{ ...POCKET, outlines: ['a'], stepover: 0.7 }]);
    checkPocket(planned, [DUMBBELL], 3);
    expect(rapidsBelow(planned)).toBe(0);
  });

  it('leaves islands standing: an outline inside another is one', () => {
    const island = ringOf([55, 40], [65, 40], [65, 50], [55, 50]);
    const planned = plan([polygon('a', BOX), polygon('b', island)], [{ ...POCKET, outlines: ['a', 'b'] }]);
    checkPocket(planned, [BOX, island], 3);
  });

  it('goes down in equal layers no thicker than the stepdown', () => {
    const planned = plan(
      [polygon('a', BOX)],
      [{ ...POCKET, outlines: ['a'], depth: 7, entry: { type: 'plunge' } }],
    );
    const levels = new Set(
      stepOf(planned, 'p')
        .moves.flatMap((move) => (move.kind === 'feed' ? [move.to.z] : []))
        .filter((z) => z < 0)
        .map((z) => z.toFixed(6)),
    );
    expect([...levels]).toEqual(['-2.333333', '-4.666667', '-7.000000']);
  });

  it.each(['ramp', 'helix'] as const)('goes down by %s no steeper than asked', (type) => {
    const planned = plan([polygon('a', BOX)], [{ ...POCKET, outlines: ['a'], entry: { type, angle: 4 } }]);
    const path = samples(stepOf(planned, 'p'), 0.05);
    const steepest = path.reduce((most, p, i) => {
      const q = path[i - 1];
      if (!q || p.rapid || q.z > 1e-9 || p.z >= q.z - 1e-9) return most;
      return Math.max(most, Math.atan2(q.z - p.z, Math.hypot(p.x - q.x, p.y - q.y)));
    }, 0);
    expect(steepest).toBeGreaterThan(0.01);
    expect((steepest * 180) / Math.PI).toBeLessThan(4.05);
  });

  it('runs out over an edge of the board that its outline reaches, at a corner over both', () => {
    const planned = plan([rect('a', 0, 0, 40, 30)], [{ ...POCKET, outlines: ['a'] }]);
    const floor = samples(stepOf(planned, 'p')).filter(({ z, rapid }) => z < -2.99 && !rapid);
    const cutter = cutterOfCut(planned.job, { cutter: 'flat6' });
    for (const p of ringOf([0.01, 0.01], [0.01, 29.9], [39.9, 0.01], [0.01, 15])) {
      expect(woodAt(floor, cutter, p)).toBeLessThan(-2.99);
    }
    expect(Math.max(...floor.map(({ x }) => x))).toBeLessThan(37.01);
    expect(Math.max(...floor.map(({ y }) => y))).toBeLessThan(27.01);
    const kept = plan([rect('a', 0, 0, 40, 30)], [{ ...POCKET, outlines: ['a'], runOut: false }]);
    expect(Math.min(...samples(stepOf(kept, 'p')).map(({ x }) => x))).toBeGreaterThan(2.99);
  });

  it('says so where a whole piece is too narrow, and cuts the rest', () => {
    const planned = plan(
      [rect('a', 20, 20, 40, 30), rect('b', 100, 20, 40, 5)],
      [{ ...POCKET, outlines: ['a', 'b'] }],
    );
    expect(planned.findings).toMatchObject([{ code: 'cutter-too-large', cut: 'p' }]);
    expect(Math.max(...samples(stepOf(planned, 'p')).map(({ x }) => x))).toBeLessThan(61);
  });

  it('climbs: the walls lie right of the travel', () => {
    for (const [direction, sign] of [
      ['climb', 1],
      ['conventional', -1],
    ] as const) {
      const planned = plan([polygon('a', BOX)], [{ ...POCKET, outlines: ['a'], direction }]);
      const all = samples(stepOf(planned, 'p'), 0.2).filter(({ z, rapid }) => z < -2.99 && !rapid);
      const walls = all.filter((p) => distanceToPoints(BOX, p) < 3.02);
      const turned = walls.reduce((sum, p, i) => {
        const q = walls[(i + 1) % walls.length]!;
        return sum + (p.x - 60) * (q.y - 45) - (q.x - 60) * (p.y - 45);
      }, 0);
      expect(Math.sign(turned)).toBe(sign);
    }
  });

  it('cuts only the leavings of an earlier pocket', () => {
    const cuts: CutInput[] = [
      { ...POCKET, id: 'first', outlines: ['a'], depth: 4 },
      { ...POCKET, id: 'p', outlines: ['a'], depth: 4, cutter: 'flat2', rest: 'first' },
    ];
    const job = plan([polygon('a', BOX)], cuts, withSmallCutter());
    const small = cutterOfCut(job.job, { cutter: 'flat2' });
    const large = cutterOfCut(job.job, { cutter: 'flat6' });
    const rest = samples(stepOf(job, 'p')).filter(({ z, rapid }) => !rapid && z < -0.1);
    const before = samples(stepOf(job, 'first')).filter(({ z, rapid }) => !rapid && z < -3.9);
    expect(Math.min(...rest.map((p) => distanceToPoints(BOX, p)))).toBeGreaterThan(1 - 0.02);
    const highest = ringOf([40, 30], [80, 30], [40, 60], [80, 60]).flatMap((corner) => {
      const near = ({ x, y }: Vec) => Math.hypot(x - corner.x, y - corner.y) < 9;
      const [after, earlier] = [rest.filter(near), before.filter(near)];
      return gridFrom(corner, { x: corner.x < 60 ? 1 : -1, y: corner.y < 45 ? 1 : -1 }).map((p) =>
        Math.min(woodAt(earlier, large, p), woodAt(after, small, p)),
      );
    });
    expect(Math.max(...highest)).toBeLessThan(-3.95);
    // Corners only: nothing along the middle of any side.
    expect(Math.max(...rest.map((p) => Math.min(p.x - 40, 80 - p.x)))).toBeLessThan(4);
    expect(Math.max(...rest.map((p) => Math.min(p.y - 30, 60 - p.y)))).toBeLessThan(4);
  });

  it.each([0, 37, 90])('clears by raster at %s° too', (angle) => {
    const planned = plan(
      [polygon('a', DUMBBELL)],
      [{ ...POCKET, outlines: ['a'], pattern: 'raster', angle, stepover: 0.6 }],
    );
    checkPocket(planned, [DUMBBELL], 3);
    expect(rapidsBelow(planned)).toBe(0);
  });

  it('relieves corners until a square part fits (check value C042: r = 3: centre (2.1213, 2.1213))', () => {
    const planned = plan([polygon('a', BOX)], [{ ...POCKET, outlines: ['a'], relief: 'dogbone' }]);
    const floor = samples(stepOf(planned, 'p'), 0.05).filter(({ z, rapid }) => z < -2.99 && !rapid);
    const cutter = cutterOfCut(planned.job, { cutter: 'flat6' });
    for (const corner of BOX) {
      const inward = { x: corner.x < 60 ? 1 : -1, y: corner.y < 45 ? 1 : -1 };
      const centre = { x: corner.x + inward.x * 2.1213, y: corner.y + inward.y * 2.1213 };
      expect(Math.min(...floor.map((p) => Math.hypot(p.x - centre.x, p.y - centre.y)))).toBeLessThan(0.01);
      const hair = { x: corner.x + inward.x * 0.01, y: corner.y + inward.y * 0.01 };
      expect(woodAt(floor, cutter, hair)).toBeLessThan(-2.99);
    }
    // Nowhere further over a wall than the relief asks for: r (1 − 1/√2).
    const over = Math.max(...floor.map((p) => Math.max(40 - p.x, p.x - 80, 30 - p.y, p.y - 60) + 3));
    expect(over).toBeCloseTo(3 * (1 - Math.SQRT1_2), 2);
  });

  it('leaves an allowance on its walls, or takes it off with a last pass', () => {
    const nearest = (change: object) => {
      const planned = plan([polygon('a', BOX)], [{ ...POCKET, outlines: ['a'], allowance: 0.4, ...change }]);
      const run = samples(stepOf(planned, 'p')).filter(({ z, rapid }) => z < -1 && !rapid);
      return Math.min(...run.map((p) => distanceToPoints(BOX, p)));
    };
    expect(nearest({})).toBeCloseTo(3.4, 2);
    expect(nearest({ finish: true })).toBeCloseTo(3, 2);
  });

  it('holds for random polygons', { timeout: 60_000 }, () => {
    const radii = fc.array(fc.double({ min: 6, max: 28, noNaN: true }), { minLength: 5, maxLength: 11 });
    const stepover = fc.double({ min: 0.2, max: 0.95, noNaN: true });
    fc.assert(
      fc.property(radii, stepover, (lengths, share) => {
        const ring = lengths.map((r, i) => {
          const angle = (2 * Math.PI * i) / lengths.length;
          return { x: 100 + r * Math.cos(angle), y: 50 + r * Math.sin(angle) };
        });
        const planned = plan([polygon('a', ring)], [{ ...POCKET, outlines: ['a'], stepover: share }]);
        if (planned.steps.length > 0) checkPocket(planned, [ring], 3);
      }),
      { numRuns: 12, seed: 20 },
    );
  });
});

/** Points up to 3 mm from a right corner that a cutter of radius 1 can reach, but for a hair at its own corner arc. */
function gridFrom(corner: Vec, way: Vec): Vec[] {
  const steps = Array.from({ length: 21 }, (_, i) => 0.02 + i * 0.15);
  return steps.flatMap((dx) =>
    steps
      .filter((dy) => dx >= 1 || dy >= 1 || Math.hypot(1 - dx, 1 - dy) <= 0.98)
      .map((dy) => ({ x: corner.x + way.x * dx, y: corner.y + way.y * dy })),
  );
}

function withSmallCutter() {
  const planned = plan([rect('a', 20, 20, 40, 30)], [{ ...POCKET, outlines: ['a'] }]);
  const flat = cutterOfCut(planned.job, { cutter: 'flat6' });
  return { cutters: [...planned.job.cutters, { ...flat, id: 'flat2', number: 7, diameter: 2 }] };
}
