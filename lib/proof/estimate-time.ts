import { JUNCTION_DEVIATION } from '@/lib/base/tolerances';
import type { Machine } from '@/lib/job/machine-schema';
import { motionLength, planLength, type Motion } from './motion';
import type { WorkStep } from './read-intent';

type Limits = Pick<Machine, 'rapid' | 'feedMax' | 'acceleration'>;
type Direction = readonly [number, number, number];

/** A motion as the planner of a controller sees it: mm, mm/s, mm/s². */
interface Block {
  readonly length: number;
  readonly speed: number;
  readonly acceleration: number;
  readonly start: Direction;
  readonly end: Direction;
}

/**
 * Seconds of each step: a controller with look-ahead that accelerates at no more than the machine can, xy as one vector
 * and z by itself, and takes corners at the speed that a junction deviation of 0.01 mm allows (the cornering rule that
 * Grbl's documentation publishes). It comes to rest at every stand-still.
 */
export function estimateSeconds(steps: readonly WorkStep[], limits: Limits): number[] {
  const seconds = new Array<number>(steps.length).fill(0);
  let first = 0;
  for (let i = 0; i <= steps.length; i++) {
    const step = steps[i];
    if (step?.kind === 'motion') continue;
    runSeconds(steps.slice(first, i) as Motion[], limits).forEach((value, k) => (seconds[first + k] = value));
    if (step) seconds[i] = step.seconds;
    first = i + 1;
  }
  return seconds;
}

/** Seconds of each motion of a run from rest to rest. */
export function runSeconds(motions: readonly Motion[], limits: Limits): number[] {
  const seconds = new Array<number>(motions.length).fill(0);
  const moving = motions.flatMap((motion, i) => {
    const block = blockOf(motion, limits);
    return block ? [{ block, i }] : [];
  });
  const blocks = moving.map(({ block }) => block);
  const entry = entrySpeeds(blocks);
  blocks.forEach((block, k) => (seconds[moving[k]!.i] = blockSeconds(block, entry[k]!, entry[k + 1]!)));
  return seconds;
}

/** Trapezoid, or a triangle where the motion is too short to reach its speed (elementary kinematics). */
function blockSeconds({ length, speed, acceleration }: Block, from: number, to: number): number {
  const reachable = Math.sqrt((2 * acceleration * length + from * from + to * to) / 2);
  const peak = Math.max(Math.min(speed, reachable), from, to);
  const ramps = (2 * peak * peak - from * from - to * to) / (2 * acceleration);
  return (2 * peak - from - to) / acceleration + Math.max(0, length - ramps) / peak;
}

/** Speed at the start of each block and 0 at the end of the last: backward so that it can brake, then forward. */
function entrySpeeds(blocks: readonly Block[]): number[] {
  const entry = new Array<number>(blocks.length + 1).fill(0);
  for (let i = blocks.length - 1; i > 0; i--) {
    const block = blocks[i]!;
    const braking = Math.sqrt(entry[i + 1]! ** 2 + 2 * block.acceleration * block.length);
    entry[i] = Math.min(junctionSpeed(blocks[i - 1]!, block), braking);
  }
  for (let i = 1; i < blocks.length; i++) {
    const before = blocks[i - 1]!;
    entry[i] = Math.min(entry[i]!, Math.sqrt(entry[i - 1]! ** 2 + 2 * before.acceleration * before.length));
  }
  return entry;
}

/** v² = a·δ·s / (1 − s) with s = sin(θ/2), θ the angle between the motions: 180° straight on. */
function junctionSpeed(before: Block, after: Block): number {
  const most = Math.min(before.speed, after.speed);
  const cosine = -dot(before.end, after.start);
  const s = Math.sqrt(Math.max(0, (1 - cosine) / 2));
  if (s > 1 - 1e-9) return most;
  const acceleration = Math.min(before.acceleration, after.acceleration);
  return Math.min(most, Math.sqrt((acceleration * JUNCTION_DEVIATION * s) / (1 - s)));
}

function blockOf(motion: Motion, { rapid, feedMax, acceleration }: Limits): Block | null {
  const length = motionLength(motion);
  if (length < 1e-9) return null;
  const across = planLength(motion) / length;
  const up = Math.abs(motion.to.z - motion.from.z) / length;
  const most = motion.rapid ? rapid : feedMax;
  const limit = Math.min(share(most.xy, across), share(most.z, up)) / 60;
  const asked = motion.rapid ? limit : Math.min(limit, motion.feed / 60);
  const along = Math.min(share(acceleration.xy, across), share(acceleration.z, up));
  const { start, end } = directions(motion, length);
  const { arc, from } = motion;
  // Round an arc the whole acceleration points to its centre.
  const round = arc ? Math.sqrt(acceleration.xy * Math.hypot(from.x - arc.x, from.y - arc.y)) : Infinity;
  const speed = Math.min(asked, across > 0 ? round / across : Infinity);
  return { length, speed: Math.max(speed, 1e-6), acceleration: along, start, end };
}

function share(limit: number, part: number): number {
  return part > 1e-12 ? limit / part : Infinity;
}

function directions(motion: Motion, length: number): { start: Direction; end: Direction } {
  const { from, to, arc } = motion;
  const z = (to.z - from.z) / length;
  if (!arc) {
    const line: Direction = [(to.x - from.x) / length, (to.y - from.y) / length, z];
    return { start: line, end: line };
  }
  const flat = planLength(motion) / length;
  const tangent = (p: { x: number; y: number }): Direction => {
    const [rx, ry] = [p.x - arc.x, p.y - arc.y];
    const size = Math.hypot(rx, ry) || 1;
    const turn = arc.sweep > 0 ? flat / size : -flat / size;
    return [-ry * turn, rx * turn, z];
  };
  return { start: tangent(from), end: tangent(to) };
}

function dot(a: Direction, b: Direction): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}
