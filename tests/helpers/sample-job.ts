import type { JobInput } from '@/lib/job/job-schema';

/** A small two-face job that is right in every part; tests change one thing and look at what is said of it. */
export function sampleJob(): JobInput {
  return {
    format: 'spindleaf-job',
    version: 1,
    name: 'Sample',
    board: { x: 200, y: 100, z: 18 },
    order: ['B', 'A'],
    setups: {
      A: { zero: { corner: 'front-left', z: 'surface' } },
      B: { zero: { corner: 'back-left', z: 'surface' } },
    },
    machine: {
      name: 'Bench router',
      travel: { x: 800, y: 800, z: 80 },
      rapid: { xy: 5000, z: 1500 },
      feedMax: { xy: 4000, z: 1200 },
      acceleration: { xy: 400, z: 200 },
      spindle: { min: 8000, max: 24000 },
      clearance: 6,
      approach: 1.5,
      controller: { dialect: 'grbl' },
    },
    cutters: [
      {
        id: 'flat6',
        number: 1,
        name: '6 mm upcut',
        kind: 'flat',
        diameter: 6,
        fluteLength: 25,
        reach: 35,
        shank: 6,
        speeds: { rpm: 18000, feed: 1800, plunge: 500, stepdown: 3, stepover: 0.45 },
      },
      {
        id: 'v60',
        number: 2,
        name: '60 degree V-bit',
        kind: 'vbit',
        diameter: 6,
        angle: 60,
        fluteLength: 10,
        reach: 25,
        shank: 6,
        speeds: { rpm: 18000, feed: 1200, plunge: 400, stepdown: 2, stepover: 0.1 },
      },
    ],
    outlines: [
      {
        id: 'part',
        name: 'Part',
        face: 'A',
        shape: { type: 'rect', x: 15, y: 15, width: 170, height: 70 },
      },
      {
        id: 'recess',
        name: 'Recess',
        face: 'B',
        shape: { type: 'ellipse', cx: 60, cy: 50, rx: 20, ry: 15 },
      },
    ],
    cuts: [
      { id: 'c1', kind: 'pocket', face: 'B', outlines: ['recess'], cutter: 'flat6', depth: 6 },
      { id: 'c2', kind: 'chamfer', face: 'B', outlines: ['part'], cutter: 'v60', side: 'outside', width: 2 },
      {
        id: 'c3',
        kind: 'profile',
        face: 'A',
        outlines: ['part'],
        cutter: 'flat6',
        side: 'outside',
        depth: 'through',
        tabs: { length: 8, height: 'auto', placement: { type: 'count', count: 4 } },
      },
    ],
  };
}

/** A deep copy of `value` with the value at `path` (`cuts.0.depth`) replaced, or removed where `to` is undefined. */
export function withValue<T>(value: T, path: string, to: unknown): T {
  const copy = structuredClone(value);
  const keys = path.split('.');
  const last = keys.pop()!;
  let at = copy as Record<string, unknown>;
  for (const key of keys) at = at[key] as Record<string, unknown>;
  if (to === undefined) delete at[last];
  else at[last] = to;
  return copy;
}
