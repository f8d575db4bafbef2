import { fail, ok, type Result } from '@/lib/base/result';
import { catalogueFont } from './font-catalogue';
import type { GlyphSource } from './glyph-source';
import { parseLineFont } from './line-font';
import { parseOutlineFont } from './outline-font';

/** Bytes of the fonts at hand, by catalogue id. The caller reads the files; the core never does. */
export type FontBook = ReadonlyMap<string, ArrayBuffer>;

/** Parsed fonts by their bytes, so that a document with a hundred texts reads each font once. */
const parsed = new WeakMap<ArrayBuffer, Result<GlyphSource, string>>();

/** The font of that id, ready for layout, or a sentence on why there is none. */
export function findFont(fonts: FontBook, id: string): Result<GlyphSource, string> {
  const entry = catalogueFont(id);
  if (!entry) return fail(`no font '${id}' in the catalogue.`);
  const bytes = fonts.get(id);
  if (!bytes) return fail(`font '${id}' was not loaded.`);
  const known = parsed.get(bytes);
  if (known) return known;
  const parse = entry.kind === 'line' ? parseLineFont : parseOutlineFont;
  const result = parseSafely(parse, bytes, id);
  parsed.set(bytes, result);
  return result;
}

/** Font readers throw on damaged files, in many ways; all of them mean the same to the caller. */
function parseSafely(
  parse: (bytes: ArrayBuffer) => GlyphSource,
  bytes: ArrayBuffer,
  id: string,
): Result<GlyphSource, string> {
  try {
    return ok(parse(bytes));
  } catch {
    return fail(`the file of font '${id}' is damaged.`);
  }
}
