import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { contourLength, fractionOfPoint, pointAtFraction } from '@/lib/geometry/contour-length';
import { fitArcs } from '@/lib/geometry/fit-arcs';
import { flattenContour } from '@/lib/geometry/flatten';
import { circleRing } from '@/lib/geometry/offset';
import { contoursToPathData } from '@/lib/geometry/path-data';
import { simplifyRing } from '@/lib/geometry/simplify';
import { centreOfArc } from '@/lib/geometry/svg-arc';
import { parseSvgPath } from '@/lib/geometry/svg-path';
import { orderTour, tourLength } from '@/lib/geometry/tour';
import type { Contour } from '@/lib/geometry/contour';

function contours(d: string): Contour[] {
  const parsed = parseSvgPath(d);
  if (!parsed.ok) throw new Error(`${parsed.error.offset}: ${parsed.error.message}`);
  return parsed.value;
}
const ends = (d: string): string =>
  contours(d)
    .map(({ start, segments }) =>
      [start, ...segments.map(({ to }) => to)].map(({ x, y }) => `${x},${y}`).join(' '),
    )
    .join(' | ');

describe('path data (SVG 2, 9.3)', () => {
  it.each<[string, string]>([
    ['M1 2L3 4', '1,2 3,4'],
    ['m1 2 3 4 5 6', '1,2 4,6 9,12'],
    ['M0 0H5V5h-5z', '0,0 5,0 5,5 0,5 0,0'],
    ['M0 0 1 0 1 1ZL9 9', '0,0 1,0 1,1 0,0 | 0,0 9,9'],
    ['M.5.5-1-1', '0.5,0.5 -1,-1'],
    ['M1e1,2E0L3-4', '10,2 3,-4'],
    ['M0 0C1 1 2 1 3 0S5-1 6 0', '0,0 3,0 6,0'],
    ['M0 0Q1 2 2 0T4 0', '0,0 2,0 4,0'],
    ['M0 0a1 1 0 012 0', '0,0 2,0'],
    ['M0 0 L1 1 M5 5', '0,0 1,1'],
    ['', ''],
  ])('%s', (d, expected) => {
    expect(ends(d)).toBe(expected);
  });

  it.each<[string, number, RegExp]>([
    ['L1 1', 0, /begin with M/],
    ['M1', 2, /the data end/],
    ['M1 1 L2', 7, /the data end/],
    ['M0 0 A1 1 0 2 0 3 3', 12, /flag/],
    ['M0 0 X', 5, /not a path command/],
    ['M0 0 L1 1,', 10, /after the comma/],
    ['M0 0 L1e9 0', 6, /too large/],
  ])('refuses %s with its place', (d, offset, sentence) => {
    const parsed = parseSvgPath(d);
    expect(parsed).toMatchObject({ ok: false, error: { offset, message: expect.stringMatching(sentence) } });
  });

  it('reflects handles of S and T, and makes cubics of quadratics exactly', () => {
    const [cubic] = contours('M0 0C0 1 2 1 2 0S4-1 4 0');
    expect(cubic?.segments[1]).toMatchObject({ control1: { x: 2, y: -1 } });
    const [quadratic] = contours('M0 0Q3 6 6 0');
    expect(quadratic?.segments[0]).toEqual({
      kind: 'cubic',
      control1: { x: 2, y: 4 },
      control2: { x: 4, y: 4 },
      to: { x: 6, y: 0 },
    });
  });

  it('reads again what was written, to its rounding', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.integer({ min: -9999, max: 9999 }), fc.integer({ min: -9999, max: 9999 })), {
          minLength: 3,
          maxLength: 12,
        }),
        (points) => {
          const d = `M${points.map(([x, y]) => `${x / 100} ${y / 100}`).join(' L')} Z`;
          expect(contoursToPathData(contours(contoursToPathData(contours(d))))).toBe(
            contoursToPathData(contours(d)),
          );
        },
      ),
      { seed: 6, numRuns: 200 },
    );
  });
});

describe('arcs by the implementation notes (SVG 2, B.2)', () => {
  it('find a centre at which both ends lie on the ellipse, and the turn that the flags ask for', () => {
    const number = fc.double({ min: -50, max: 50, noNaN: true });
    const radius = fc.double({ min: 0.5, max: 60, noNaN: true });
    fc.assert(
      fc.property(
        number,
        number,
        radius,
        radius,
        fc.double({ min: 0, max: 6, noNaN: true }),
        fc.boolean(),
        fc.boolean(),
        (x, y, rx, ry, rotation, largeArc, sweep) => {
          fc.pre(Math.hypot(x, y) > 0.1);
          const arc = centreOfArc({ x: 0, y: 0 }, { rx, ry, rotation, largeArc, sweep, to: { x, y } });
          for (const p of [
            { x: 0, y: 0 },
            { x, y },
          ]) {
            const dx = p.x - arc.center.x;
            const dy = p.y - arc.center.y;
            const u = (dx * Math.cos(rotation) + dy * Math.sin(rotation)) / arc.rx;
            const v = (-dx * Math.sin(rotation) + dy * Math.cos(rotation)) / arc.ry;
            expect(u * u + v * v).toBeCloseTo(1, 5);
          }
          expect(arc.sweepAngle > 0).toBe(sweep);
          // Radii that had to grow leave exactly half a turn, which is neither.
          if (arc.rx === rx && Math.abs(Math.abs(arc.sweepAngle) - Math.PI) > 1e-6)
            expect(Math.abs(arc.sweepAngle) > Math.PI).toBe(largeArc);
        },
      ),
      { seed: 7, numRuns: 400 },
    );
  });

  it('with y up, sweep flag 1 is counter-clockwise, and circles stay exact', () => {
    const [contour] = contours('M10 0 A10 10 0 0 1 0 10');
    expect(contour?.segments).toEqual([
      { kind: 'arc', to: { x: 0, y: 10 }, center: { x: 0, y: 0 }, ccw: true },
    ]);
  });

  it('grow radii that cannot reach (B.2.5), take a radius of 0 as a line, drop what goes nowhere', () => {
    expect(contours('M0 0 A1 1 0 0 1 10 0')[0]?.segments[0]).toMatchObject({
      kind: 'arc',
      center: { x: 5, y: 0 },
    });
    expect(contours('M0 0 A0 5 0 0 1 10 0')[0]?.segments[0]).toMatchObject({ kind: 'line' });
    expect(contours('M0 0 A5 5 0 0 1 0 0 L1 1')[0]?.segments).toHaveLength(1);
  });
});

describe('lengths', () => {
  it('of a circle, an ellipse quarter and a straight cubic are those of the books', () => {
    expect(contourLength(contours('M10 0A10 10 0 0 1 -10 0A10 10 0 0 1 10 0z')[0]!)).toBeCloseTo(
      20 * Math.PI,
      9,
    );
    // Complete elliptic integral: perimeter of a 2:1 ellipse of half axes 2 and 1 is 9.688448220547675 (tables).
    expect(4 * contourLength(contours('M2 0A2 1 0 0 1 0 1')[0]!)).toBeCloseTo(9.688448, 5);
    expect(contourLength(contours('M0 0C1 0 2 0 3 0')[0]!)).toBeCloseTo(3, 12);
  });

  it('and fractions find their way back', () => {
    const contour = contours('M0 0L10 0A5 5 0 0 1 10 10C5 15 2 12 0 10z')[0]!;
    for (const fraction of [0.01, 0.2, 0.45, 0.6, 0.8, 0.99]) {
      const { point } = pointAtFraction(contour, fraction);
      expect(fractionOfPoint(contour, point)).toBeCloseTo(fraction, 4);
    }
  });
});

describe('fewer points', () => {
  it('flattening keeps within its tolerance of a circle, with few chords', () => {
    const { points } = flattenContour(contours('M20 0A20 20 0 0 1 -20 0A20 20 0 0 1 20 0z')[0]!, 0.01);
    points.forEach((a, i) => {
      const b = points[(i + 1) % points.length]!;
      expect(20 - Math.hypot((a.x + b.x) / 2, (a.y + b.y) / 2)).toBeLessThan(0.0101);
    });
    expect(points.length).toBeLessThan(110);
  });

  it('simplifying drops what lies on a line, and arcs are found again within theirs', () => {
    const square = [0, 1, 2, 3].flatMap((side) =>
      Array.from({ length: 10 }, (_, i) => {
        const t = i / 10;
        return [
          { x: t, y: 0 },
          { x: 1, y: t },
          { x: 1 - t, y: 1 },
          { x: 0, y: 1 - t },
        ][side]!;
      }),
    );
    expect(simplifyRing(square, 0.001)).toHaveLength(4);
    const pieces = fitArcs(circleRing({ x: 3, y: 4 }, 20), { closed: true, tolerance: 0.005 });
    expect(pieces.length).toBeLessThan(6);
    for (const piece of pieces) {
      if (piece.kind !== 'arc') throw new Error('a line on a circle');
      expect(Math.hypot(piece.center.x - 3, piece.center.y - 4)).toBeLessThan(0.005);
      expect(piece.ccw).toBe(true);
    }
  });

  it('tours visit everything once, and are no longer than nearest neighbour alone', () => {
    const place = fc.record({ x: fc.integer({ min: 0, max: 400 }), y: fc.integer({ min: 0, max: 150 }) });
    fc.assert(
      fc.property(
        fc.array(fc.record({ entry: place, exit: place, reversible: fc.boolean() }), {
          minLength: 1,
          maxLength: 30,
        }),
        (items) => {
          const from = { x: 0, y: 0 };
          const tour = orderTour(items, from);
          expect(tour.map(({ index }) => index).sort((a, b) => a - b)).toEqual(items.map((_, i) => i));
          expect(tour.every(({ index, reversed }) => !reversed || items[index]!.reversible)).toBe(true);
          expect(tourLength(tour, items, from)).toBeLessThanOrEqual(
            tourLength(
              items.map((_, index) => ({ index, reversed: false })),
              items,
              from,
            ) + 1200,
          );
        },
      ),
      { seed: 8, numRuns: 150 },
    );
  });
});
