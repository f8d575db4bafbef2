import type { WorkControl } from '@/lib/base/cancel';
import { fail, ok, type Result } from '@/lib/base/result';
import type { Box, Contour } from '@/lib/geometry/contour';
import { flattenContour } from '@/lib/geometry/flatten';
import { pointsBox } from '@/lib/geometry/measure';
import { contoursToPathData } from '@/lib/geometry/path-data';
import { multiply, transformContour, type Matrix } from '@/lib/geometry/transform';
import type { JobInput } from '@/lib/job/job-schema';
import { MM_PER_PX, splitLength, userLength } from './svg-length';
import { readSvgTree, type ImportProblem, type SvgElement } from './svg-tree';
import { readViewBox, viewBoxMatrix } from './view-box';
import { walkDrawing, type LeftOutItem } from './walk-drawing';

export interface ImportOptions {
  /** 1: as large as the file says. */
  readonly scale?: number;
  /** Where the lower left corner of what is drawn comes to lie, mm. */
  readonly at?: { readonly x: number; readonly y: number };
  readonly control?: WorkControl;
}

/** A drawing as outlines of a job, in mm, y up. */
export interface SvgImport {
  readonly outlines: JobInput['outlines'];
  /** What the outlines span at scale 1, mm. */
  readonly size: { readonly width: number; readonly height: number };
  /** How a length of the file became millimetres. */
  readonly unit: 'lengths' | 'pixels';
  readonly leftOut: readonly LeftOutItem[];
}

const LARGEST = 50_000;
/** Chords for measuring what is drawn lie this near to it, mm. */
const BOX_TOLERANCE = 0.002;

/**
 * Reads an SVG drawing. Sizes come from `width` and `height` with their units, or from the viewBox as CSS pixels of
 * 1/96 inch. Every drawn element becomes one outline; what cannot become one is listed with its line. Fails on files that
 * are no SVG, hold a DOCTYPE or a script, or draw nothing.
 */
export function importSvg(text: string, options: ImportOptions = {}): Result<SvgImport, ImportProblem> {
  const tree = readSvgTree(text);
  if (!tree.ok) return tree;
  const { matrix, viewport, unit } = pageOf(tree.value);
  const { drawn, leftOut } = walkDrawing(tree.value, matrix, viewport, options.control);
  const all = drawn.flatMap(({ contours }) => contours);
  const box = contoursBox(all);
  if (!box) {
    const message =
      leftOut.length > 0
        ? `The drawing has no outline; what it has was left out (line ${leftOut[0]?.line ?? 1}: ${leftOut[0]?.what ?? ''}).`
        : 'The drawing is empty.';
    return fail({ line: 1, column: 1, message });
  }
  const size = { width: box.maxX - box.minX, height: box.maxY - box.minY };
  const scale = options.scale ?? 1;
  if (!(Math.max(size.width, size.height) * scale <= LARGEST))
    return fail({ line: 1, column: 1, message: `The drawing is larger than ${LARGEST} mm.` });
  const at = options.at ?? { x: 0, y: 0 };
  const place: Matrix = [scale, 0, 0, scale, at.x - box.minX * scale, at.y - box.minY * scale];
  const ids = new Set<string>();
  const outlines = drawn.map(({ name, contours, fillRule }) => ({
    id: freeId(name, ids),
    name: name.slice(0, 200),
    face: 'A' as const,
    shape: {
      type: 'path' as const,
      d: contoursToPathData(contours.map((contour) => transformContour(contour, place))),
      fillRule,
    },
  }));
  return ok({ outlines, size, unit, leftOut });
}

/** From the root's user units to mm with y up, and the viewport that percentages are of. */
function pageOf(root: SvgElement): {
  matrix: Matrix;
  viewport: { width: number; height: number };
  unit: SvgImport['unit'];
} {
  const box = readViewBox(root.attributes.get('viewBox'));
  const width = sizeOf(root, 'width');
  const height = sizeOf(root, 'height');
  // One size alone keeps the viewBox's proportions; none at all takes its units as pixels.
  const w = width ?? (box ? (height !== null ? (height * box.width) / box.height : box.width) : 300);
  const h = height ?? (box ? (w * box.height) / box.width : 150);
  const inner = box
    ? viewBoxMatrix(box, { width: w, height: h }, root.attributes.get('preserveAspectRatio'))
    : null;
  const toMm: Matrix = [MM_PER_PX, 0, 0, -MM_PER_PX, 0, 0];
  const units = ['width', 'height'].map((name) => splitLength(root.attributes.get(name))?.unit ?? '');
  return {
    matrix: inner ? multiply(toMm, inner) : toMm,
    viewport: box ? { width: box.width, height: box.height } : { width: w, height: h },
    unit: units.some((unit) => unit !== '' && unit !== 'px' && unit !== '%') ? 'lengths' : 'pixels',
  };
}

/** The root's width or height in pixels; a percentage is of a page that we do not have. */
function sizeOf(root: SvgElement, name: 'width' | 'height'): number | null {
  const text = root.attributes.get(name);
  if (splitLength(text)?.unit === '%') return null;
  const length = userLength(text, 0);
  return length !== null && length > 0 ? length : null;
}

function contoursBox(contours: readonly Contour[]): Box | null {
  const points = contours.flatMap((contour) => flattenContour(contour, BOX_TOLERANCE).points);
  return points.length > 0 ? pointsBox(points) : null;
}

/** An id as the job document takes it, from the drawing's own name where that has any letter of use. */
function freeId(name: string, taken: Set<string>): string {
  const plain = name
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9_-]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 32);
  const stem = plain === '' ? 'outline' : plain;
  let id = stem;
  for (let number = 2; taken.has(id); number++) id = `${stem}-${number}`;
  taken.add(id);
  return id;
}

export type { ImportProblem } from './svg-tree';
