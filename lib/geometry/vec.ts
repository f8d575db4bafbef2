/** A point or a vector in the plane, mm; x to the right, y up (away from the operator). */
export interface Vec {
  readonly x: number;
  readonly y: number;
}

export function vec(x: number, y: number): Vec {
  return { x, y };
}

export function add(a: Vec, b: Vec): Vec {
  return { x: a.x + b.x, y: a.y + b.y };
}

export function subtract(a: Vec, b: Vec): Vec {
  return { x: a.x - b.x, y: a.y - b.y };
}

export function scale(a: Vec, by: number): Vec {
  return { x: a.x * by, y: a.y * by };
}

/** a + (b − a)·t: a at t = 0, b at t = 1. */
export function lerp(a: Vec, b: Vec, t: number): Vec {
  return { x: a.x + (b.x - a.x) * t, y: a.y + (b.y - a.y) * t };
}

export function dot(a: Vec, b: Vec): number {
  return a.x * b.x + a.y * b.y;
}

/** z of the cross product: positive when b lies counter-clockwise of a. */
export function cross(a: Vec, b: Vec): number {
  return a.x * b.y - a.y * b.x;
}

export function length(a: Vec): number {
  return Math.sqrt(a.x * a.x + a.y * a.y);
}

export function distance(a: Vec, b: Vec): number {
  const dx = a.x - b.x;
  const dy = a.y - b.y;
  return Math.sqrt(dx * dx + dy * dy);
}

/** Unit vector along a, or null where a has no direction. */
export function normalize(a: Vec): Vec | null {
  const size = length(a);
  return size > 0 && Number.isFinite(size) ? { x: a.x / size, y: a.y / size } : null;
}

/** a turned 90° counter-clockwise: the left of someone walking along a. */
export function leftOf(a: Vec): Vec {
  return { x: -a.y, y: a.x };
}

/** a turned counter-clockwise about the origin by `angle` radians. */
export function rotate(a: Vec, angle: number): Vec {
  const c = Math.cos(angle);
  const s = Math.sin(angle);
  return { x: a.x * c - a.y * s, y: a.x * s + a.y * c };
}

export const DEGREES = Math.PI / 180;
