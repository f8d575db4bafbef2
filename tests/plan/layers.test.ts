import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layerDepths } from '@/lib/plan/shared/layers';

describe('layerDepths', () => {
  it.each([
    [0, 6, 3, [3, 6]],
    [0, 6.1, 3, [6.1 / 3, (6.1 * 2) / 3, 6.1]],
    [2, 6, 3, [4, 6]],
    [0, 2, 3, [2]],
    [0, 0.07, 0.01, [0.01, 0.02, 0.03, 0.04, 0.05, 0.06, 0.07]],
    [5, 5, 3, [5]],
  ])('from %s to %s by at most %s', (top, floor, stepdown, depths) => {
    const found = layerDepths(top, floor, stepdown);
    expect(found).toHaveLength(depths.length);
    found.forEach((depth, i) => expect(depth).toBeCloseTo(depths[i]!, 9));
  });

  it('gives equal layers no thicker than the stepdown, the last exactly at the floor', () => {
    const depth = fc.double({ min: 0.01, max: 60, noNaN: true });
    fc.assert(
      fc.property(depth, depth, depth, (top, more, stepdown) => {
        const floor = top + more;
        const depths = layerDepths(top, floor, stepdown);
        const thickness = depths.map((d, i) => d - (depths[i - 1] ?? top));
        expect(depths.at(-1)).toBe(floor);
        expect(Math.max(...thickness)).toBeLessThanOrEqual(stepdown + 1e-6);
        expect(Math.max(...thickness) - Math.min(...thickness)).toBeLessThan(1e-9);
      }),
      { seed: 3, numRuns: 200 },
    );
  });
});
