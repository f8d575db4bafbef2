import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { FONT_CATALOGUE } from '@/lib/outline/font-catalogue';
import { findFont } from '@/lib/outline/fonts';

function bytesOf(file: string): ArrayBuffer {
  const buffer = readFileSync(new URL(`../../public/fonts/${file}`, import.meta.url));
  return buffer.buffer.slice(buffer.byteOffset, buffer.byteOffset + buffer.byteLength);
}

/** Reads `cmap` (format 4) and `hmtx` by the OpenType specification, apart from any font library. */
function advanceInTables(bytes: ArrayBuffer, character: string): { advance: number; unitsPerEm: number } {
  const view = new DataView(bytes);
  const tables = new Map<string, number>();
  for (let i = 0; i < view.getUint16(4); i++) {
    const at = 12 + 16 * i;
    const tag = String.fromCharCode(...[0, 1, 2, 3].map((k) => view.getUint8(at + k)));
    tables.set(tag, view.getUint32(at + 8));
  }
  const cmap = tables.get('cmap')!;
  let glyph = 0;
  for (let i = 0; i < view.getUint16(cmap + 2); i++) {
    const sub = cmap + view.getUint32(cmap + 4 + 8 * i + 4);
    if (view.getUint16(sub) !== 4) continue;
    const half = view.getUint16(sub + 6);
    const code = character.codePointAt(0)!;
    for (let s = 0; s < half; s += 2) {
      const end = view.getUint16(sub + 14 + s);
      const start = view.getUint16(sub + 16 + half + s);
      if (code < start || code > end) continue;
      const delta = view.getInt16(sub + 16 + 2 * half + s);
      const rangeAt = sub + 16 + 3 * half + s;
      const range = view.getUint16(rangeAt);
      glyph =
        range === 0
          ? (code + delta) & 0xffff
          : (view.getUint16(rangeAt + range + 2 * (code - start)) + delta) & 0xffff;
    }
  }
  const metrics = view.getUint16(tables.get('hhea')! + 34);
  const advance = view.getUint16(tables.get('hmtx')! + 4 * Math.min(glyph, metrics - 1));
  return { advance, unitsPerEm: view.getUint16(tables.get('head')! + 18) };
}

describe('advances', () => {
  it.each(FONT_CATALOGUE.filter(({ kind }) => kind === 'outline'))(
    'of $id are those of the font’s own tables',
    ({ id, file }) => {
      const bytes = bytesOf(file);
      const font = findFont(new Map([[id, bytes]]), id);
      if (!font.ok) throw new Error(font.error);
      for (const character of 'AVToQ27mi.é') {
        const expected = advanceInTables(bytes, character);
        expect(font.value.unitsPerEm).toBe(expected.unitsPerEm);
        expect(font.value.glyph(character)?.advance).toBe(expected.advance);
      }
    },
  );

  it('the single-line font has every printable ASCII character, as open strokes', () => {
    const font = findFont(new Map([['line', bytesOf('line.json')]]), 'line');
    if (!font.ok) throw new Error(font.error);
    for (let code = 32; code < 127; code++) {
      const glyph = font.value.glyph(String.fromCharCode(code));
      expect(glyph?.advance).toBeGreaterThan(0);
      expect(glyph?.contours.every(({ closed }) => !closed)).toBe(true);
      if (code > 32) expect(glyph?.contours.length).toBeGreaterThan(0);
    }
    expect(font.value.singleLine).toBe(true);
  });
});
