import fc from 'fast-check';
import type { Ring } from '@/lib/geometry/contour';

/** A counter-clockwise ring that does not cross itself: points round a middle, at uneven distances from it. */
export const starRing: fc.Arbitrary<Ring> = fc
  .array(
    fc.tuple(fc.double({ min: 0.15, max: 1, noNaN: true }), fc.double({ min: 4, max: 40, noNaN: true })),
    {
      minLength: 5,
      maxLength: 24,
    },
  )
  .map((spokes) => {
    const total = spokes.reduce((sum, [width]) => sum + width, 0);
    let angle = 0;
    return spokes.map(([width, far]) => {
      angle += (width / total) * 2 * Math.PI;
      return { x: far * Math.cos(angle), y: far * Math.sin(angle) };
    });
  });

/** A convex ring: corners on an ellipse. */
export const convexRing: fc.Arbitrary<Ring> = fc
  .tuple(
    fc.uniqueArray(fc.integer({ min: 0, max: 359 }), { minLength: 4, maxLength: 16 }),
    fc.double({ min: 3, max: 50, noNaN: true }),
    fc.double({ min: 3, max: 50, noNaN: true }),
  )
  .map(([degrees, a, b]) =>
    [...degrees]
      .sort((p, q) => p - q)
      .map((degree) => ({
        x: a * Math.cos((degree * Math.PI) / 180),
        y: b * Math.sin((degree * Math.PI) / 180),
      })),
  );
