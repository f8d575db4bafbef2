import type { Entry } from '@/lib/job/cut-schema';
import { DEGREES } from '@/lib/geometry/vec';
import { cutFinding, cutName, type AnyCutWork } from './cut-work';
import type { Finding } from '@/lib/report/report';

/** Shorter tracks than this share of the cutter's diameter cannot carry a ramp. */
const SHORTEST_RAMP_TRACK = 0.5;

/** How one cut goes down: a slope in degrees, or straight where `angle` is null. */
export interface Descent {
  readonly angle: number | null;
}

/**
 * How the cutter goes down along a track: a ramp where one is asked for or a plunge is not possible; straight down
 * where a plunge is asked for or the track is too short for any ramp.
 */
export function descentAlong(work: AnyCutWork, entry: Entry, trackLength: number): Descent {
  const tooShort = trackLength < SHORTEST_RAMP_TRACK * work.cutter.diameter;
  const wantsRamp = entry.type !== 'plunge' || !work.cutter.centreCutting;
  return { angle: wantsRamp && !tooShort ? entry.angle : null };
}

/** Length of track that a descent of `height` takes. */
export function rampLength(height: number, angle: number): number {
  return Math.max(0, height) / Math.tan(angle * DEGREES);
}

/** The finding of a plunge that could not be avoided with a cutter that does not cut at its centre. */
export function plungeFindings(work: AnyCutWork, descent: Descent, at: { x: number; y: number }): Finding[] {
  if (descent.angle !== null || work.cutter.centreCutting) return [];
  const message = `${cutName(work)} must plunge, but ${work.cutter.name} does not cut at its centre.`;
  return [cutFinding(work, 'no-centre-cut', message, at)];
}
