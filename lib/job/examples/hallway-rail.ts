import type { JobInput } from '../job-schema';
import { demoCutters, demoMachine } from './demo-shop';

/** A leaf with its stem at (x, y), pointing along +x, drawn as two curves. */
function leaf(x: number, y: number, length: number, width: number): string {
  const at = (dx: number, dy: number) => `${x + dx * length} ${y + dy * width}`;
  return `M${at(0, 0)} C${at(0.25, -0.9)} ${at(0.7, -0.7)} ${at(1, 0)} C${at(0.7, 0.7)} ${at(0.25, 0.9)} ${at(0, 0)} Z`;
}

/**
 * A coat rail of ash, cut from both faces: a dado for its cleat, the maker's mark and a chamfer on the back (face B);
 * a leaf motif for coloured resin, a chamfer and the cut-out on the front (face A). The tabs stand clear of whatever
 * the back takes away. The pins change places when the board is turned about x and fit under no other turn.
 */
export const hallwayRail: JobInput = {
  format: 'spindleaf-job',
  version: 1,
  name: 'Hallway rail',
  display: 'mm',
  board: { x: 480, y: 140, z: 19, material: 'ash', grain: 'x' },
  turn: { axis: 'x' },
  pins: [
    { x: 12, y: 20, diameter: 6, depth: 12 },
    { x: 12, y: 120, diameter: 6, depth: 12 },
  ],
  order: ['B', 'A'],
  setups: {
    A: {
      zero: { corner: 'front-left', z: 'surface' },
      clamps: [
        { x: -20, y: 55, width: 30, depth: 30, height: 24 },
        { x: 470, y: 55, width: 30, depth: 30, height: 24 },
      ],
    },
    B: {
      zero: { corner: 'back-left', z: 'surface' },
      clamps: [
        { x: 225, y: -20, width: 30, depth: 26, height: 24 },
        { x: 225, y: 134, width: 30, depth: 26, height: 24 },
      ],
    },
  },
  machine: demoMachine,
  cutters: [demoCutters.flat6, demoCutters.flat3, demoCutters.v60],
  outlines: [
    {
      id: 'rail',
      name: 'Rail',
      face: 'A',
      shape: { type: 'rect', x: 30, y: 15, width: 420, height: 110, radius: 16 },
    },
    {
      id: 'leaves',
      name: 'Leaves',
      face: 'A',
      shape: {
        type: 'path',
        d: [leaf(80, 70, 90, 24), leaf(195, 70, 90, 24), leaf(310, 70, 90, 24)].join(' '),
      },
    },
    {
      id: 'dado',
      name: 'Cleat dado',
      face: 'B',
      shape: { type: 'rect', x: 0, y: 80, width: 480, height: 18 },
    },
    {
      id: 'mark',
      name: 'Maker’s mark',
      face: 'B',
      shape: { type: 'text', text: 'Q.T.L. 27', font: 'line', size: 16, x: 240, y: 42, align: 'center' },
    },
  ],
  cuts: [
    {
      id: 'dado',
      name: 'Cleat dado',
      kind: 'pocket',
      face: 'B',
      outlines: ['dado'],
      cutter: 'flat6',
      depth: 6,
    },
    { id: 'mark', name: 'Mark', kind: 'engrave', face: 'B', outlines: ['mark'], cutter: 'v60', depth: 0.8 },
    {
      id: 'edge-b',
      name: 'Back edge',
      kind: 'chamfer',
      face: 'B',
      outlines: ['rail'],
      cutter: 'v60',
      side: 'outside',
      width: 2,
    },
    {
      id: 'leaves',
      name: 'Leaves for resin',
      kind: 'pocket',
      face: 'A',
      outlines: ['leaves'],
      cutter: 'flat3',
      depth: 3,
      entry: { type: 'helix', angle: 4 },
    },
    {
      id: 'edge-a',
      name: 'Front edge',
      kind: 'chamfer',
      face: 'A',
      outlines: ['rail'],
      cutter: 'v60',
      side: 'outside',
      width: 2,
    },
    {
      id: 'cut-out',
      name: 'Cut-out',
      kind: 'profile',
      face: 'A',
      outlines: ['rail'],
      cutter: 'flat6',
      side: 'outside',
      depth: 'through',
      tabs: { length: 8, height: 'auto', hold: 4, placement: { type: 'count', count: 6 } },
    },
  ],
};
