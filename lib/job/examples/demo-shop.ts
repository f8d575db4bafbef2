import type { JobInput } from '../job-schema';

/** The router of the demo workshop. */
export const demoMachine: JobInput['machine'] = {
  name: 'Bench router',
  travel: { x: 800, y: 800, z: 80 },
  rapid: { xy: 5000, z: 1500 },
  feedMax: { xy: 4000, z: 1200 },
  acceleration: { xy: 400, z: 200 },
  spindle: { min: 8000, max: 24000 },
  clearance: 8,
  approach: 1.5,
  controller: { dialect: 'grbl', units: 'mm', arcs: true, toolChange: 'split', spinUp: 3 },
};

/** The cutters of the demo workshop by id; a job lists those that it uses. Speeds are starting points for hardwood. */
export const demoCutters = {
  flat6: {
    id: 'flat6',
    number: 1,
    name: '6 mm two-flute upcut',
    kind: 'flat',
    diameter: 6,
    flutes: 2,
    fluteLength: 25,
    reach: 35,
    shank: 6,
    speeds: { rpm: 18000, feed: 1800, plunge: 500, stepdown: 3, stepover: 0.45 },
  },
  flat3: {
    id: 'flat3',
    number: 2,
    name: '3 mm two-flute upcut',
    kind: 'flat',
    diameter: 3,
    flutes: 2,
    fluteLength: 14,
    reach: 20,
    shank: 6,
    speeds: { rpm: 20000, feed: 1200, plunge: 350, stepdown: 1.5, stepover: 0.4 },
  },
  v60: {
    id: 'v60',
    number: 3,
    name: '60 degree V-bit',
    kind: 'vbit',
    diameter: 12,
    angle: 60,
    tip: 0,
    flutes: 2,
    fluteLength: 10,
    reach: 25,
    shank: 6,
    speeds: { rpm: 18000, feed: 1200, plunge: 400, stepdown: 2, stepover: 0.05 },
  },
} as const satisfies Record<string, JobInput['cutters'][number]>;
