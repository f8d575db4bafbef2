import fc from 'fast-check';
import GeometryFactory from 'jsts/org/locationtech/jts/geom/GeometryFactory.js';
import Coordinate from 'jsts/org/locationtech/jts/geom/Coordinate.js';
import BufferOp from 'jsts/org/locationtech/jts/operation/buffer/BufferOp.js';
import { describe, expect, it } from 'vitest';
import { differenceRegions, intersectRegions, resolveFill, unionRegions } from '@/lib/geometry/boolean';
import type { Region, Ring } from '@/lib/geometry/contour';
import { createDistanceQuery } from '@/lib/geometry/distance-query';
import { regionArea, regionContains, ringArea, ringLength } from '@/lib/geometry/measure';
import { circleRing, offsetRegion, strokePolyline } from '@/lib/geometry/offset';
import { convexRing, starRing } from './random-shapes';

/** Area of the same offset by an independent library (JTS), its quarter circles in 64 chords. */
function jtsOffsetArea(ring: Ring, delta: number): number {
  const corners = [...ring, ring[0]!].map(({ x, y }) => new Coordinate(x, y));
  const polygon = new GeometryFactory().createPolygon(corners);
  return BufferOp.bufferOp(polygon, delta, 64).getArea();
}

describe('growing', () => {
  it('a convex ring follows Steiner’s formula A + P·d + π·d²', () => {
    fc.assert(
      fc.property(convexRing, fc.double({ min: 0.1, max: 12, noNaN: true }), (ring, d) => {
        const exact = ringArea(ring) + ringLength(ring) * d + Math.PI * d * d;
        expect(regionArea(offsetRegion([ring], d))).toBeCloseTo(exact, exact > 1000 ? -1 : 0);
        // Chords lie within 0.0025 mm of the arcs: the area lacks at most that much along them.
        expect(Math.abs(regionArea(offsetRegion([ring], d)) - exact)).toBeLessThan(
          0.0025 * 2 * Math.PI * d + 0.01,
        );
      }),
      { seed: 1, numRuns: 150 },
    );
  });

  it('a square by 3 mm with sharp corners keeps its corners', () => {
    const square = [
      { x: 0, y: 0 },
      { x: 10, y: 0 },
      { x: 10, y: 10 },
      { x: 0, y: 10 },
    ];
    expect(regionArea(offsetRegion([square], 3, { corners: 'sharp' }))).toBeCloseTo(256, 3);
  });
});

describe('against an independent library (JTS)', () => {
  it('areas of grown and shrunk rings agree', () => {
    fc.assert(
      fc.property(starRing, fc.double({ min: -8, max: 8, noNaN: true }), (ring, d) => {
        fc.pre(Math.abs(d) > 0.05);
        const exact = jtsOffsetArea(ring, d);
        const bound = 0.004 * (ringLength(ring) + 2 * Math.PI * Math.abs(d)) + 0.02;
        expect(Math.abs(regionArea(offsetRegion([ring], d)) - exact)).toBeLessThan(bound);
      }),
      { seed: 2, numRuns: 300 },
    );
  });
});

describe('against plain distances', () => {
  it('a point is in the grown region just when it is near enough to the ring or in it', () => {
    fc.assert(
      fc.property(
        starRing,
        fc.double({ min: -6, max: 6, noNaN: true }),
        fc.array(
          fc.tuple(
            fc.double({ min: -50, max: 50, noNaN: true }),
            fc.double({ min: -50, max: 50, noNaN: true }),
          ),
          { minLength: 20, maxLength: 20 },
        ),
        (ring, d, places) => {
          fc.pre(Math.abs(d) > 0.05);
          const grown = offsetRegion([ring], d);
          const query = createDistanceQuery([ring]);
          for (const [x, y] of places) {
            const p = { x, y };
            const signed = regionContains([ring], p) ? -query.distance(p) : query.distance(p);
            if (Math.abs(signed - d) < 0.01) continue;
            expect(regionContains(grown, p)).toBe(signed < d);
          }
        },
      ),
      { seed: 3, numRuns: 200 },
    );
  });

  it('a round ring of radius 1.9 shrunk by 2.7 is gone, and does not come out turned inside out', () => {
    expect(offsetRegion([circleRing({ x: 5, y: 5 }, 1.9)], -2.7)).toEqual([]);
    const hole = [...circleRing({ x: 5, y: 5 }, 1.9)].reverse();
    const plate = [
      { x: 0, y: 0 },
      { x: 10, y: 0 },
      { x: 10, y: 10 },
      { x: 0, y: 10 },
    ];
    expect(offsetRegion([plate, hole], 2.7)).toHaveLength(1);
  });

  it('a disc along a right angle sweeps 2·r·L − r² + r²·π/4 + π·r²', () => {
    const line = {
      points: [
        { x: 0, y: 0 },
        { x: 10, y: 0 },
        { x: 10, y: 10 },
      ],
      closed: false,
    };
    expect(regionArea(strokePolyline(line, 1))).toBeCloseTo(40 - 1 + Math.PI / 4 + Math.PI, 1);
  });
});

describe('booleans', () => {
  it('keep the balance of areas: |A ∪ B| + |A ∩ B| = |A| + |B|, |A \\ B| = |A| − |A ∩ B|', () => {
    fc.assert(
      fc.property(starRing, starRing, fc.integer({ min: -30, max: 30 }), (first, second, dx) => {
        const a: Region = resolveFill([first], 'nonzero');
        const b: Region = resolveFill([second.map(({ x, y }) => ({ x: x + dx, y }))], 'nonzero');
        const both = regionArea(intersectRegions(a, b));
        expect(
          Math.abs(regionArea(unionRegions([a, b])) + both - regionArea(a) - regionArea(b)),
        ).toBeLessThan(0.02);
        expect(Math.abs(regionArea(differenceRegions(a, b)) - regionArea(a) + both)).toBeLessThan(0.02);
      }),
      { seed: 4, numRuns: 200 },
    );
  });

  it('clean what is not a plain ring: bow-ties, doubled points, no area; refuse what is not finite', () => {
    const bowTie = [
      { x: 0, y: 0 },
      { x: 10, y: 10 },
      { x: 10, y: 0 },
      { x: 0, y: 10 },
    ];
    expect(regionArea(resolveFill([bowTie], 'evenodd'))).toBeCloseTo(50, 6);
    const doubled = [
      { x: 0, y: 0 },
      { x: 0, y: 0 },
      { x: 5, y: 0 },
      { x: 5, y: 0 },
      { x: 5, y: 5 },
      { x: 2, y: 2 },
    ];
    expect(regionArea(offsetRegion([doubled], 1))).toBeGreaterThan(12.5);
    expect(
      resolveFill(
        [
          [
            { x: 0, y: 0 },
            { x: 5, y: 0 },
            { x: 9, y: 0 },
          ],
        ],
        'nonzero',
      ),
    ).toEqual([]);
    expect(() =>
      resolveFill(
        [
          [
            { x: 0, y: Number.NaN },
            { x: 1, y: 0 },
            { x: 0, y: 1 },
          ],
        ],
        'nonzero',
      ),
    ).toThrow(RangeError);
    expect(() => offsetRegion([bowTie], Number.NaN)).toThrow(RangeError);
  });
});

describe('distances', () => {
  it('are those of a plain search through every edge', () => {
    fc.assert(
      fc.property(
        starRing,
        fc.double({ min: -90, max: 90, noNaN: true }),
        fc.double({ min: -90, max: 90, noNaN: true }),
        (ring, x, y) => {
          let near = Number.POSITIVE_INFINITY;
          ring.forEach((a, i) => {
            const b = ring[(i + 1) % ring.length]!;
            const size = (b.x - a.x) ** 2 + (b.y - a.y) ** 2;
            const t = Math.min(1, Math.max(0, ((x - a.x) * (b.x - a.x) + (y - a.y) * (b.y - a.y)) / size));
            near = Math.min(near, Math.hypot(a.x + t * (b.x - a.x) - x, a.y + t * (b.y - a.y) - y));
          });
          expect(createDistanceQuery([ring]).distance({ x, y })).toBeCloseTo(near, 9);
        },
      ),
      { seed: 5, numRuns: 400 },
    );
  });
});
