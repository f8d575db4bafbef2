import type { ArcMove } from '@/lib/moves/move';

/** A point in whole steps of the last decimal. */
export interface StepPoint {
  readonly x: number;
  readonly y: number;
}

/** A piece of an arc as it can be written: ends and centre in whole steps. */
export interface StepArc {
  readonly to: StepPoint;
  readonly center: StepPoint;
  /** By how much the radii at its two ends differ, steps. */
  readonly mismatch: number;
  /** Share of the whole arc done at its end. */
  readonly share: number;
}

/**
 * An arc in pieces of half a turn at most, with its centre rounded: near a full turn, rounding could take the end past
 * the start and make a whole circle of nothing. `center` is in steps, not yet rounded.
 */
export function splitArc(from: StepPoint, to: StepPoint, center: StepPoint, ccw: boolean): StepArc[] {
  const whole = { x: Math.round(center.x), y: Math.round(center.y) };
  const start = Math.atan2(from.y - center.y, from.x - center.x);
  const sweep = sweepBetween(from, to, center, ccw);
  const count = Math.abs(sweep) > Math.PI * 1.0001 ? 2 : 1;
  const radius = Math.hypot(to.x - center.x, to.y - center.y);
  const pieces: StepArc[] = [];
  let at = from;
  for (let i = 1; i <= count; i++) {
    const angle = start + (sweep * i) / count;
    const end =
      i === count
        ? { x: to.x, y: to.y }
        : {
            x: Math.round(center.x + radius * Math.cos(angle)),
            y: Math.round(center.y + radius * Math.sin(angle)),
          };
    const mismatch = Math.abs(
      Math.hypot(at.x - whole.x, at.y - whole.y) - Math.hypot(end.x - whole.x, end.y - whole.y),
    );
    pieces.push({ to: end, center: whole, mismatch, share: i / count });
    at = end;
  }
  return pieces;
}

/** Signed turn from one point to another about a centre; equal points mean a full circle. */
function sweepBetween(from: StepPoint, to: StepPoint, center: StepPoint, ccw: boolean): number {
  const full = 2 * Math.PI;
  if (from.x === to.x && from.y === to.y) return ccw ? full : -full;
  const a = Math.atan2(from.y - center.y, from.x - center.x);
  const b = Math.atan2(to.y - center.y, to.x - center.x);
  let turn = b - a;
  if (ccw && turn <= 0) turn += full;
  if (!ccw && turn >= 0) turn -= full;
  return turn;
}

/** Points along an arc move, mm, the last at its end; chords lie within `tolerance` of it. */
export function arcPoints(
  from: { x: number; y: number },
  { to, cx, cy, ccw }: ArcMove,
  tolerance: number,
): { x: number; y: number }[] {
  const radius = Math.hypot(to.x - cx, to.y - cy);
  const isFull = Math.hypot(to.x - from.x, to.y - from.y) < 1e-6;
  const start = Math.atan2(from.y - cy, from.x - cx);
  const sweep = isFull ? (ccw ? 2 : -2) * Math.PI : sweepBetween(from, to, { x: cx, y: cy }, ccw);
  const step = radius > tolerance ? 2 * Math.acos(1 - tolerance / radius) : Math.PI / 2;
  const count = Math.max(1, Math.ceil(Math.abs(sweep) / step));
  return Array.from({ length: count }, (_, i) => {
    if (i === count - 1) return { x: to.x, y: to.y };
    const angle = start + (sweep * (i + 1)) / count;
    return { x: cx + radius * Math.cos(angle), y: cy + radius * Math.sin(angle) };
  });
}
