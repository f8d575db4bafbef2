import type { Contour } from '@/lib/geometry/contour';

/** One glyph in font units, y up, its origin on the base line. */
export interface Glyph {
  /** Identifies the glyph within its font; kerning is asked for by it. */
  readonly index: number;
  /** Distance to the next glyph's origin, font units. */
  readonly advance: number;
  readonly contours: readonly Contour[];
}

/** What text layout needs of a font, whatever its file format. Lengths are font units: mm = units · size / unitsPerEm. */
export interface GlyphSource {
  readonly unitsPerEm: number;
  /** Height of a capital without overshoot, font units; a wanted capital height H asks for size H · unitsPerEm / capHeight. */
  readonly capHeight: number;
  /** Strokes along the letters' middles rather than their contours. */
  readonly singleLine: boolean;
  /** The glyph of one Unicode character, or null where the font has none. */
  glyph(character: string): Glyph | null;
  /** What is added to the advance between two neighbours, font units; mostly negative. */
  kerning(left: Glyph, right: Glyph): number;
}
