import type { FaceName } from '@/lib/report/report';
import { modelPoint, type BoardModel } from './board-model';
import { cellAt } from './height-field';

/** A picture of a face, row by row from its back edge, RGBA. */
export interface FacePixels {
  readonly width: number;
  readonly height: number;
  readonly rgba: Uint8ClampedArray<ArrayBuffer>;
}

type Colour = readonly [number, number, number];

/** Uncut face, deepest floor, and what lies beneath where the board is cut through. */
const FACE: Colour = [240, 223, 192];
const DEEP: Colour = [139, 92, 52];
const THROUGH: Colour = [62, 58, 54];
/** How strongly a slope of 1 brightens or darkens. */
const RELIEF = 0.35;

/** A shaded picture of one cut face, light from the back left, at most `longest` pixels along its longer side. */
export function facePixels(model: BoardModel, face: FaceName, longest = 480): FacePixels {
  const { board } = model;
  const scale = longest / Math.max(board.x, board.y);
  const width = Math.max(1, Math.round(board.x * scale));
  const height = Math.max(1, Math.round(board.y * scale));
  const heights = pictureHeights(model, face, width, height);
  const rgba = new Uint8ClampedArray(4 * width * height);
  const pixel = board.x / width;
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const z = heights[y * width + x]!;
      const left = heights[y * width + Math.max(0, x - 1)]!;
      const behind = heights[Math.max(0, y - 1) * width + x]!;
      const colour = shade(z, board.z, (2 * z - left - behind) / (2 * pixel));
      rgba.set([...colour, 255], 4 * (y * width + x));
    }
  }
  return { width, height, rgba };
}

/** Heights against the face at the pixels' middles; −Infinity where the board is cut through. */
function pictureHeights(model: BoardModel, face: FaceName, width: number, height: number): Float64Array {
  const { board, fields } = model;
  const heights = new Float64Array(width * height);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const view = { x: ((x + 0.5) * board.x) / width, y: board.y - ((y + 0.5) * board.y) / height };
      const p = modelPoint(model, face, view);
      const cell = cellAt(fields.A, p.x, p.y);
      const through = board.z + fields.A.z[cell]! + fields.B.z[cell]! <= 1e-3;
      heights[y * width + x] = through ? -Infinity : fields[face].z[cell]!;
    }
  }
  return heights;
}

function shade(z: number, thickness: number, slope: number): Colour {
  if (z === -Infinity) return THROUGH;
  const depth = Math.min(1, -z / thickness);
  const light = 1 + (Number.isFinite(slope) ? Math.max(-1, Math.min(1, slope)) : -1) * RELIEF;
  const tone = (i: 0 | 1 | 2) => (FACE[i] + (DEEP[i] - FACE[i]) * depth) * light;
  return [tone(0), tone(1), tone(2)];
}
