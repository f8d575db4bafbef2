import type { JobInput } from '../job-schema';
import { demoMachine } from './demo-shop';

const INCH = 25.4;

/**
 * A jig for shelf pins in half-inch birch plywood, thought out in inches: bores for guide bushes, a row of drilled
 * holes, two slots for its fence bolts, all through, then the outside.
 */
export const drillJig: JobInput = {
  format: 'spindleaf-job',
  version: 1,
  name: 'Drill jig',
  display: 'in',
  board: { x: 12 * INCH, y: 5 * INCH, z: INCH / 2, material: 'birch plywood', grain: 'x' },
  order: ['A'],
  setups: { A: { zero: { corner: 'front-left', z: 'surface' }, clamps: [] } },
  machine: {
    ...demoMachine,
    controller: { dialect: 'grbl', units: 'in', arcs: true, toolChange: 'split', spinUp: 3 },
  },
  cutters: [
    {
      id: 'drill3-16',
      number: 1,
      name: '3/16 in brad-point drill',
      kind: 'drill',
      diameter: (3 / 16) * INCH,
      angle: 118,
      flutes: 2,
      fluteLength: 2 * INCH,
      reach: 2 * INCH,
      shank: (3 / 16) * INCH,
      speeds: { rpm: 8000, feed: 400, plunge: 300, stepdown: 6, stepover: 0.5 },
    },
    {
      id: 'flat1-4',
      number: 2,
      name: '1/4 in two-flute upcut',
      kind: 'flat',
      diameter: INCH / 4,
      flutes: 2,
      fluteLength: INCH,
      reach: 1.25 * INCH,
      shank: INCH / 4,
      speeds: { rpm: 18000, feed: 1800, plunge: 500, stepdown: 3, stepover: 0.45 },
    },
  ],
  outlines: [
    {
      id: 'jig',
      name: 'Jig',
      face: 'A',
      shape: {
        type: 'rect',
        x: INCH,
        y: 0.75 * INCH,
        width: 10 * INCH,
        height: 3.5 * INCH,
        radius: INCH / 4,
      },
    },
    {
      id: 'pilot-holes',
      name: 'Pilot holes',
      face: 'A',
      shape: {
        type: 'points',
        at: [1, 2, 3, 4, 5, 6, 7, 8].map((i) => [(1.5 + i) * INCH, 1.25 * INCH] as [number, number]),
      },
    },
    ...[3, 6, 9].map((inches, i) => ({
      id: `bush-${i + 1}`,
      name: `Guide bush ${i + 1}`,
      face: 'A' as const,
      shape: {
        type: 'ellipse' as const,
        cx: inches * INCH,
        cy: 3.25 * INCH,
        rx: INCH / 4,
        ry: INCH / 4,
      },
    })),
    ...[2.5, 7.5].map((inches, i) => ({
      id: `slot-${i + 1}`,
      name: `Fence slot ${i + 1}`,
      face: 'A' as const,
      shape: {
        type: 'rect' as const,
        x: inches * INCH,
        y: 2 * INCH,
        width: 2 * INCH,
        height: (5 / 16) * INCH,
        radius: (5 / 32) * INCH,
      },
    })),
  ],
  cuts: [
    {
      id: 'pilots',
      name: 'Pilot holes',
      kind: 'drill',
      face: 'A',
      outlines: ['pilot-holes'],
      cutter: 'drill3-16',
      depth: 'through',
      below: 0.2,
      peck: 5,
      feed: 300,
    },
    {
      id: 'bushes',
      name: 'Guide bushes',
      kind: 'bore',
      face: 'A',
      outlines: ['bush-1', 'bush-2', 'bush-3'],
      cutter: 'flat1-4',
      depth: 'through',
      pitch: 1.5,
    },
    {
      id: 'slots',
      name: 'Fence slots',
      kind: 'pocket',
      face: 'A',
      outlines: ['slot-1', 'slot-2'],
      cutter: 'flat1-4',
      depth: 'through',
    },
    {
      id: 'cut-out',
      name: 'Cut-out',
      kind: 'profile',
      face: 'A',
      outlines: ['jig'],
      cutter: 'flat1-4',
      side: 'outside',
      depth: 'through',
      tabs: { length: INCH / 4, height: 4, placement: { type: 'count', count: 4 } },
    },
  ],
};
