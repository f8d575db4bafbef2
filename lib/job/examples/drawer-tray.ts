import type { JobInput } from '../job-schema';
import { demoCutters, demoMachine } from './demo-shop';

const COMPARTMENTS = ['pens', 'clips', 'round', 'cards'];

/**
 * A tray for a desk drawer: compartments of several sizes in one board, cleared with a large cutter and their corners
 * with a small one, which cuts only what the large one had to leave; then the tray is cut out.
 */
export const drawerTray: JobInput = {
  format: 'spindleaf-job',
  version: 1,
  name: 'Drawer tray',
  display: 'mm',
  board: { x: 340, y: 240, z: 18, material: 'maple', grain: 'x' },
  order: ['A'],
  setups: {
    A: {
      zero: { corner: 'front-left', z: 'bed' },
      clamps: [
        { x: -20, y: 105, width: 26, depth: 30, height: 24 },
        { x: 334, y: 105, width: 26, depth: 30, height: 24 },
      ],
    },
  },
  machine: demoMachine,
  cutters: [demoCutters.flat6, demoCutters.flat3],
  outlines: [
    {
      id: 'tray',
      name: 'Tray',
      face: 'A',
      shape: { type: 'rect', x: 20, y: 20, width: 300, height: 200, radius: 10 },
    },
    {
      id: 'pens',
      name: 'Pens',
      face: 'A',
      shape: { type: 'rect', x: 30, y: 150, width: 280, height: 60, radius: 2 },
    },
    {
      id: 'clips',
      name: 'Clips',
      face: 'A',
      shape: { type: 'rect', x: 30, y: 30, width: 80, height: 110, radius: 2 },
    },
    { id: 'round', name: 'Coins', face: 'A', shape: { type: 'ellipse', cx: 160, cy: 85, rx: 40, ry: 40 } },
    {
      id: 'cards',
      name: 'Cards',
      face: 'A',
      shape: { type: 'rect', x: 210, y: 30, width: 100, height: 110, radius: 2 },
    },
  ],
  cuts: [
    {
      id: 'clear',
      name: 'Compartments',
      kind: 'pocket',
      face: 'A',
      outlines: COMPARTMENTS,
      cutter: 'flat6',
      depth: 12,
      entry: { type: 'helix', angle: 4 },
    },
    {
      id: 'corners',
      name: 'Corners',
      kind: 'pocket',
      face: 'A',
      outlines: COMPARTMENTS,
      cutter: 'flat3',
      depth: 12,
      rest: 'clear',
    },
    {
      id: 'cut-out',
      name: 'Cut-out',
      kind: 'profile',
      face: 'A',
      outlines: ['tray'],
      cutter: 'flat6',
      side: 'outside',
      depth: 'through',
      tabs: { length: 8, height: 4, placement: { type: 'count', count: 6 } },
    },
  ],
};
