import type { Contour } from '@/lib/geometry/contour';
import { parseSvgPath } from '@/lib/geometry/svg-path';
import { transformContour } from '@/lib/geometry/transform';
import type { Glyph, GlyphSource } from './glyph-source';

/** The file of a single-line font: ASCII JSON, lengths in font units, path data with y up. */
interface LineFontFile {
  readonly unitsPerEm: number;
  readonly capHeight: number;
  /** Character → advance and path data. */
  readonly glyphs: Readonly<Record<string, readonly [advance: number, strokes: string]>>;
  /** Marks that are set on letters: path data about x = 0. */
  readonly marks: Readonly<Record<string, string>>;
  /** Character → letter, mark, and how far the mark is moved. */
  readonly composites: Readonly<
    Record<string, readonly [letter: string, mark: string, x: number, y: number]>
  >;
  /** Left letter + right letter → what is added to the advance. */
  readonly kerning: Readonly<Record<string, number>>;
}

/** A single-line font of ours. Throws where the file is damaged. */
export function parseLineFont(bytes: ArrayBuffer): GlyphSource {
  const file = JSON.parse(asciiText(bytes)) as LineFontFile;
  const glyphs = new Map<string, Glyph>();
  const letters: string[] = [];
  for (const character of [...Object.keys(file.glyphs), ...Object.keys(file.composites)]) {
    glyphs.set(character, { index: letters.length, ...drawGlyph(file, character) });
    letters.push(baseLetter(file, character));
  }
  return {
    unitsPerEm: file.unitsPerEm,
    capHeight: file.capHeight,
    singleLine: true,
    glyph: (character) => glyphs.get(character) ?? null,
    kerning: (left, right) => file.kerning[`${letters[left.index]}${letters[right.index]}`] ?? 0,
  };
}

/** The letter that an accented one is kerned like. */
function baseLetter(file: LineFontFile, character: string): string {
  return file.composites[character]?.[0] ?? character;
}

function drawGlyph(file: LineFontFile, character: string): Omit<Glyph, 'index'> {
  const composite = file.composites[character];
  const [advance, strokes] = file.glyphs[baseLetter(file, character)]!;
  const contours = strokesOf(strokes);
  if (!composite) return { advance, contours };
  const [, mark, x, y] = composite;
  const placed = strokesOf(file.marks[mark]!).map((contour) => transformContour(contour, [1, 0, 0, 1, x, y]));
  return { advance, contours: [...contours, ...placed] };
}

function strokesOf(data: string): readonly Contour[] {
  if (data === '') return [];
  const parsed = parseSvgPath(data);
  if (!parsed.ok) throw new Error(`${parsed.error.message} in '${data}'`);
  return parsed.value;
}

function asciiText(bytes: ArrayBuffer): string {
  let text = '';
  for (const byte of new Uint8Array(bytes)) text += String.fromCharCode(byte);
  return text;
}
