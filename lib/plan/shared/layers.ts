import { COUNT_SLACK } from '@/lib/base/tolerances';

/**
 * Depths of the layers from `top` to `floor`, both mm below the face: as few layers of equal thickness as keep each at
 * or below `stepdown`, the last exactly at `floor`. A floor at or above the top gives that floor alone. A quotient a
 * hair above a whole number, which binary arithmetic makes of 0.07 / 0.01, does not add a layer.
 */
export function layerDepths(top: number, floor: number, stepdown: number): number[] {
  const depth = floor - top;
  if (depth <= 0) return [floor];
  const count = Math.max(1, Math.ceil(depth / stepdown - COUNT_SLACK));
  const depths = Array.from({ length: count - 1 }, (_, i) => top + (depth * (i + 1)) / count);
  return [...depths, floor];
}
