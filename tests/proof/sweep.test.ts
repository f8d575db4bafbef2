import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { CutterShape } from '@/lib/proof/cutter-shape';
import { cellCentre, createHeightField } from '@/lib/proof/height-field';
import type { MotionPoint } from '@/lib/proof/motion';
import { Sweeper } from '@/lib/proof/sweep';
import { lowestEdge } from './oracle';

const SHAPES: Record<string, CutterShape> = {
  flat: { kind: 'flat', radius: 3, tip: 3, steepness: 0 },
  ball: { kind: 'ball', radius: 3, tip: 0, steepness: 0 },
  'sharp V of 60°': { kind: 'cone', radius: 3, tip: 0, steepness: Math.sqrt(3) },
  'V of 90° with a flat of 1 mm': { kind: 'cone', radius: 3, tip: 0.5, steepness: 1 },
  'drill of 118°': { kind: 'cone', radius: 2.5, tip: 0, steepness: 0.6009 },
};

function swept(shape: CutterShape, chain: readonly MotionPoint[], step = 0.5) {
  const field = createHeightField({ x: 0, y: 0, width: 30, height: 20 }, step);
  const sweeper = new Sweeper(field, shape);
  sweeper.moveTo(chain[0]!);
  for (const p of chain.slice(1)) sweeper.lineTo(p);
  sweeper.finish();
  return { field, sweeper };
}

const point = fc.record({
  x: fc.double({ min: -4, max: 34, noNaN: true }),
  y: fc.double({ min: -4, max: 24, noNaN: true }),
  z: fc.double({ min: -9, max: 2, noNaN: true }),
});
const chains = fc.oneof(
  fc.array(point, { minLength: 2, maxLength: 5 }),
  // Axis-parallel, level, upright and repeated points: where special cases hide.
  fc.array(
    fc.record({
      x: fc.constantFrom(5, 5.25, 12, 20),
      y: fc.constantFrom(4, 8.75, 15),
      z: fc.constantFrom(-6, -3, 1),
    }),
    { minLength: 2, maxLength: 6 },
  ),
  // Many short pieces: joints.
  fc
    .array(
      fc.record({
        dx: fc.double({ min: -1, max: 1, noNaN: true }),
        dy: fc.double({ min: -1, max: 1, noNaN: true }),
        dz: fc.double({ min: -0.3, max: 0.3, noNaN: true }),
      }),
      { minLength: 3, maxLength: 12 },
    )
    .map((steps) => {
      let at = { x: 15, y: 10, z: -3 };
      return [at, ...steps.map(({ dx, dy, dz }) => (at = { x: at.x + dx, y: at.y + dy, z: at.z + dz }))];
    }),
);

describe('sweeping chains of straight motions', () => {
  test.each(Object.entries(SHAPES))('%s: every cell as a slow search finds it', (_, shape) => {
    fc.assert(
      fc.property(chains, (chain) => {
        const { field } = swept(shape, chain);
        for (let cell = 0; cell < field.z.length; cell++) {
          const { x, y } = cellCentre(field, cell);
          const expected = lowestEdge(shape, chain, x, y);
          if (Math.abs(field.z[cell]! - expected) < 2e-4) continue;
          // Only a cell on the very rim may count as within or beyond the cutter.
          const rim = [1e-6, -1e-6].map((by) =>
            lowestEdge({ ...shape, radius: shape.radius + by }, chain, x, y),
          );
          const matches = rim.some((z) => Math.abs(field.z[cell]! - z) < 2e-3);
          expect(matches, `cell (${x}, ${y}): ${field.z[cell]} against ${expected}`).toBe(true);
        }
      }),
      { seed: 20260, numRuns: 24, endOnFailure: true },
    );
  });

  test('a probe leaves the surface and tells the deepest bite', () => {
    const field = createHeightField({ x: 0, y: 0, width: 30, height: 20 }, 0.5);
    const probe = new Sweeper(field, SHAPES.flat!, { probe: true });
    probe.moveTo({ x: 5, y: 10, z: 1 });
    probe.lineTo({ x: 25, y: 10, z: -1.5 });
    probe.finish();
    expect(probe.deepest).toBeCloseTo(1.5, 6);
    expect(field.z.every((z) => z === 0)).toBe(true);
  });
});

/** Cells are sampled at their centres: a volume is right to about one cell's width along its edge. */
describe('volumes against formulas', () => {
  const volume = (shape: CutterShape, chain: readonly MotionPoint[]) =>
    swept(shape, chain, 0.1).sweeper.removed;

  test('groove of a sharp V: depth² · tan α · length, and half a cone at each end', () => {
    const depth = 2;
    const halfWidth = depth / Math.sqrt(3);
    const cone = (Math.PI * halfWidth * halfWidth * depth) / 3;
    const expected = depth * halfWidth * 20 + cone;
    const chain = [
      { x: 5, y: 10.03, z: -depth },
      { x: 25, y: 10.03, z: -depth },
    ];
    expect(volume(SHAPES['sharp V of 60°']!, chain) / expected).toBeCloseTo(1, 2);
  });

  test('cone of one plunge: π r² h / 3', () => {
    const chain = [
      { x: 15.02, y: 10.01, z: 1 },
      { x: 15.02, y: 10.01, z: -4 },
    ];
    const radius = 4 / Math.sqrt(3);
    expect(volume(SHAPES['sharp V of 60°']!, chain) / ((Math.PI * radius ** 2 * 4) / 3)).toBeCloseTo(1, 2);
  });

  test('spherical cap of a ball: π h² (3R − h) / 3', () => {
    const chain = [
      { x: 15.02, y: 10.01, z: 1 },
      { x: 15.02, y: 10.01, z: -2 },
    ];
    expect(volume(SHAPES.ball!, chain) / ((Math.PI * 4 * (9 - 2)) / 3)).toBeCloseTo(1, 2);
  });

  test('slot of a flat cutter: a rectangle with round ends', () => {
    const chain = [
      { x: 8, y: 10, z: -5 },
      { x: 22, y: 10, z: -5 },
    ];
    expect(volume(SHAPES.flat!, chain) / (5 * (14 * 6 + Math.PI * 9))).toBeCloseTo(1, 2);
  });

  test('one full helix and a level turn leave a ring of the whole depth', () => {
    const at = (turn: number, z: number) => ({
      x: 15 + 4 * Math.cos(2 * Math.PI * turn),
      y: 10 + 4 * Math.sin(2 * Math.PI * turn),
      z,
    });
    const chain = [
      ...Array.from({ length: 361 }, (_, i) => at(i / 360, (-4 * i) / 360)),
      ...Array.from({ length: 360 }, (_, i) => at((i + 1) / 360, -4)),
    ];
    expect(volume(SHAPES.flat!, chain) / (Math.PI * (49 - 1) * 4)).toBeCloseTo(1, 2);
  });
});
