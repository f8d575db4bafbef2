import type { Contour } from '@/lib/geometry/contour';
import { multiply, transformContour, type Matrix } from '@/lib/geometry/transform';
import { DEGREES } from '@/lib/geometry/vec';
import type { Shape } from '@/lib/job/shape-schema';
import type { Glyph, GlyphSource } from './glyph-source';

type TextShape = Extract<Shape, { type: 'text' }>;

export interface LaidOutText {
  /** Contours glyph by glyph, in reading order. */
  readonly glyphs: readonly (readonly Contour[])[];
  /** Characters that the font has not, each once, in order of appearance. */
  readonly missing: readonly string[];
  /** Length of each line along its base line, mm. */
  readonly widths: readonly number[];
}

interface PlacedGlyph {
  readonly glyph: Glyph;
  /** Of the glyph's origin from the start of its line, mm. */
  readonly x: number;
}

/**
 * Sets a text: each line from its own start, center or end at `x`, base lines `lineHeight · size` apart downwards, the
 * whole turned about (x, y). A glyph's origin = Σ (advance + kerning) · size / unitsPerEm + letterSpacing of those before it. The space after
 * a line's last glyph is no part of its width. A character without a glyph leaves half an em.
 */
export function layOutText(shape: TextShape, source: GlyphSource): LaidOutText {
  const missing = new Set<string>();
  const lines = shape.text
    .normalize('NFC')
    .split(/\r\n|\r|\n/)
    .map((line) => placeLine(line, shape, source, missing));
  const glyphs = lines.flatMap(({ placed, width }, row) => {
    const toBoard = lineMatrix(shape, row, alignShift(shape.align, width));
    return placed.map(({ glyph, x }) => drawGlyph(glyph, x, toBoard, shape.size / source.unitsPerEm));
  });
  return {
    glyphs: glyphs.filter((contours) => contours.length > 0),
    missing: [...missing],
    widths: lines.map(({ width }) => width),
  };
}

function placeLine(line: string, shape: TextShape, source: GlyphSource, missing: Set<string>) {
  const scale = shape.size / source.unitsPerEm;
  const placed: PlacedGlyph[] = [];
  let pen = 0;
  let before: Glyph | null = null;
  for (const character of line.replaceAll('\t', ' ')) {
    const glyph = source.glyph(character);
    if (glyph) {
      if (before) pen += source.kerning(before, glyph) * scale;
      placed.push({ glyph, x: pen });
    } else {
      missing.add(character);
    }
    pen += (glyph ? glyph.advance * scale : shape.size / 2) + shape.letterSpacing;
    before = glyph;
  }
  return { placed, width: line === '' ? 0 : pen - shape.letterSpacing };
}

function alignShift(align: TextShape['align'], width: number): number {
  if (align === 'left') return 0;
  return align === 'center' ? -width / 2 : -width;
}

/** From a line's own frame (origin at its start on its base line) to the board. */
function lineMatrix({ x, y, rotate, size, lineHeight }: TextShape, row: number, shift: number): Matrix {
  const c = Math.cos(rotate * DEGREES);
  const s = Math.sin(rotate * DEGREES);
  return multiply([c, s, -s, c, x, y], [1, 0, 0, 1, shift, -row * lineHeight * size]);
}

function drawGlyph(glyph: Glyph, x: number, toBoard: Matrix, scale: number): Contour[] {
  const matrix = multiply(toBoard, [scale, 0, 0, scale, x, 0]);
  return glyph.contours.map((contour) => transformContour(contour, matrix));
}
