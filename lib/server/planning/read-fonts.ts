import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { FONT_CATALOGUE } from '@/lib/outline/font-catalogue';
import type { FontBook } from '@/lib/outline/fonts';

/** The shipped fonts, read from `folder`. One that is missing is left out: text in it is then a problem with its place. */
export function readFonts(folder: string): FontBook {
  const book = new Map<string, ArrayBuffer>();
  for (const { id, file } of FONT_CATALOGUE) {
    const place = path.join(folder, file);
    if (existsSync(place)) book.set(id, new Uint8Array(readFileSync(place)).buffer);
  }
  return book;
}
