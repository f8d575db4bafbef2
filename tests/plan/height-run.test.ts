import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { liftOverTabs, type HeightRun, type TabLift } from '@/lib/plan/shared/height-run';

/** z of a stretch at a length, read straight off the definition: the higher of the run and every tab's lift. */
function zByDefinition(run: HeightRun, tabs: readonly TabLift[], lap: number, at: number): number {
  const own = run.zFrom + ((run.zTo - run.zFrom) * (at - run.from)) / (run.to - run.from);
  return tabs.reduce((most, { at: middle, half, top, slope }) => {
    const turns = Number.isFinite(lap) ? [-3, -2, -1, 0, 1, 2, 3] : [0];
    const away = Math.min(...turns.map((n) => Math.abs(at - middle - n * lap)));
    if (away <= half) return Math.max(most, top);
    return slope >= 90 ? most : Math.max(most, top - (away - half) * Math.tan((slope * Math.PI) / 180));
  }, own);
}

describe('liftOverTabs', () => {
  const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  const tab = fc.record({
    at: number(0, 100),
    half: number(1, 9),
    top: number(-16, -2),
    slope: fc.constantFrom(20, 45, 70, 90),
  });
  const run = fc.record({
    from: number(0, 90),
    length: number(1, 140),
    zFrom: number(-12, 0),
    fall: number(0, 8),
  });

  it('is the higher of the run and the tabs everywhere, in stretches that join', () => {
    fc.assert(
      fc.property(run, fc.array(tab, { maxLength: 4 }), ({ from, length, zFrom, fall }, tabs) => {
        const stretch = { from, to: from + length, zFrom, zTo: zFrom - fall };
        const parts = liftOverTabs(stretch, tabs, 100);
        expect(parts[0]!.from).toBe(stretch.from);
        expect(parts.at(-1)!.to).toBe(stretch.to);
        parts.slice(1).forEach((part, i) => expect(part.from).toBeCloseTo(parts[i]!.to, 9));
        for (const { from: a, to: b, zFrom: za, zTo: zb } of parts) {
          for (const t of [0.2, 0.5, 0.8]) {
            const z = za + (zb - za) * t;
            expect(Math.abs(z - zByDefinition(stretch, tabs, 100, a + (b - a) * t))).toBeLessThan(1e-3);
          }
        }
      }),
      { seed: 11, numRuns: 300 },
    );
  });
});
