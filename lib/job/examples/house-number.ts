import type { JobInput } from '../job-schema';
import { demoCutters, demoMachine } from './demo-shop';

/**
 * A house number of oak, all from one face: taper-engraved figures whose wide strokes get a flat floor, a border
 * groove between two rounded rectangles, and the cut-out with two tabs on each long edge.
 */
export const houseNumber: JobInput = {
  format: 'spindleaf-job',
  version: 1,
  name: 'House number 27',
  display: 'mm',
  board: { x: 240, y: 170, z: 20, material: 'oak', grain: 'x' },
  order: ['A'],
  setups: {
    A: {
      zero: { corner: 'front-left', z: 'surface' },
      clamps: [
        { x: -20, y: 70, width: 26, depth: 30, height: 25 },
        { x: 234, y: 70, width: 26, depth: 30, height: 25 },
      ],
    },
  },
  machine: demoMachine,
  cutters: [demoCutters.v60, demoCutters.flat3, demoCutters.flat6],
  outlines: [
    {
      id: 'plate',
      name: 'Plate',
      face: 'A',
      shape: { type: 'rect', x: 20, y: 20, width: 200, height: 130, radius: 20 },
    },
    {
      id: 'border-outer',
      name: 'Border, outer edge',
      face: 'A',
      shape: { type: 'rect', x: 30, y: 30, width: 180, height: 110, radius: 12 },
    },
    {
      id: 'border-inner',
      name: 'Border, inner edge',
      face: 'A',
      shape: { type: 'rect', x: 34, y: 34, width: 172, height: 102, radius: 8 },
    },
    {
      id: 'figures',
      name: 'Figures',
      face: 'A',
      shape: { type: 'text', text: '27', font: 'slab', size: 96, x: 120, y: 54, align: 'center' },
    },
  ],
  cuts: [
    {
      id: 'figures',
      name: 'Figures',
      kind: 'taper-engrave',
      face: 'A',
      outlines: ['figures'],
      cutter: 'v60',
      depth: 4,
      floor: 'flat3',
    },
    {
      id: 'border',
      name: 'Border groove',
      kind: 'pocket',
      face: 'A',
      outlines: ['border-outer', 'border-inner'],
      cutter: 'flat3',
      depth: 2,
    },
    {
      id: 'cut-out',
      name: 'Cut-out',
      kind: 'profile',
      face: 'A',
      outlines: ['plate'],
      cutter: 'flat6',
      side: 'outside',
      depth: 'through',
      tabs: { length: 8, height: 4, placement: { type: 'spacing', spacing: 150 } },
    },
  ],
};
