import { parse, type Font, type PathCommand } from 'opentype.js';
import type { Contour, Segment } from '@/lib/geometry/contour';
import { distance, lerp, vec, type Vec } from '@/lib/geometry/vec';
import type { Glyph, GlyphSource } from './glyph-source';

/** Two points of a glyph nearer than this, in font units, are one. */
const SAME_UNIT = 1e-3;

/**
 * A TrueType or OpenType font (not WOFF2). Kerning comes from GPOS pair adjustment, else from the `kern` table; other layout features,
 * ligatures among them, are not applied, so that each character stays one glyph. Throws where the file is damaged.
 */
export function parseOutlineFont(bytes: ArrayBuffer): GlyphSource {
  const font = parse(bytes);
  const glyphs = new Map<string, Glyph | null>();
  return {
    unitsPerEm: font.unitsPerEm,
    capHeight: capHeight(font),
    singleLine: false,
    glyph(character) {
      let glyph = glyphs.get(character);
      if (glyph === undefined) glyphs.set(character, (glyph = readGlyph(font, character)));
      return glyph;
    },
    kerning: (left, right) => finite(font.getKerningValue(left.index, right.index)),
  };
}

/** OS/2 sCapHeight; fonts without it get 0.7 em, a usual value. */
function capHeight(font: Font): number {
  const os2 = font.tables['os2'] as { sCapHeight?: number } | undefined;
  return os2?.sCapHeight || font.unitsPerEm * 0.7;
}

function readGlyph(font: Font, character: string): Glyph | null {
  const index = font.charToGlyphIndex(character);
  if (!index) return null; // glyph 0 is .notdef
  const glyph = font.glyphs.get(index);
  const { commands } = glyph.path;
  const drawn = font.outlinesFormat === 'truetype' ? fromFirstPoint(commands) : commands;
  return { index, advance: finite(glyph.advanceWidth), contours: contoursOf(drawn) };
}

/** Font paths as contours: each is closed, with a line where the font leaves the way back unsaid. */
function contoursOf(commands: readonly PathCommand[]): Contour[] {
  const contours: Contour[] = [];
  let start = vec(0, 0);
  let at = start;
  let segments: Segment[] = [];
  const close = () => {
    if (distance(at, start) > SAME_UNIT) segments.push({ kind: 'line', to: start });
    if (segments.length > 1) contours.push({ start, segments, closed: true });
    segments = [];
    at = start;
  };
  for (const command of commands) {
    if (command.type === 'Z') {
      close();
    } else if (command.type === 'M') {
      close();
      start = at = vec(command.x, command.y);
    } else {
      const segment = segmentOf(at, command);
      if (segment.kind !== 'line' || distance(at, segment.to) > SAME_UNIT) segments.push(segment);
      at = segment.to;
    }
  }
  close();
  return contours;
}

function segmentOf(from: Vec, command: Exclude<PathCommand, { type: 'M' | 'Z' }>): Segment {
  const to = vec(command.x, command.y);
  if (command.type === 'L') return { kind: 'line', to };
  const first = vec(command.x1, command.y1);
  if (command.type === 'C') {
    return { kind: 'cubic', control1: first, control2: vec(command.x2, command.y2), to };
  }
  // A quadratic is this cubic exactly.
  return { kind: 'cubic', control1: lerp(from, first, 2 / 3), control2: lerp(to, first, 2 / 3), to };
}

/**
 * TrueType commands as the font numbers its points. The reader moves to a contour's last point and draws a line to its
 * first; the contour begins at its first, and closing it adds that line at the end.
 */
function fromFirstPoint(commands: readonly PathCommand[]): PathCommand[] {
  return commands.flatMap((command, i): PathCommand[] => {
    if (command.type === 'M' && commands[i + 1]?.type === 'L') return [];
    if (command.type === 'L' && commands[i - 1]?.type === 'M') return [{ ...command, type: 'M' }];
    return [command];
  });
}

function finite(value: number | undefined): number {
  return value !== undefined && Number.isFinite(value) ? value : 0;
}
