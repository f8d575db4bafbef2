import { FONT_CATALOGUE } from '@/lib/outline/font-catalogue';
import type { FontBook } from '@/lib/outline/fonts';

/** Fetches the fonts that text is cut with. Throws with a sentence where one does not come. */
export async function loadFontBook(): Promise<FontBook> {
  const entries = await Promise.all(
    FONT_CATALOGUE.map(async ({ id, file }): Promise<[string, ArrayBuffer]> => {
      const response = await fetch(`/fonts/${file}`);
      if (!response.ok) throw new Error(`The font '${id}' could not be fetched.`);
      return [id, await response.arrayBuffer()];
    }),
  );
  return new Map(entries);
}
