import { FONT_IDS, type FontId } from '@/lib/job/shape-schema';

/** A font that ships with the product. */
export interface CatalogueFont {
  readonly id: FontId;
  /** Name of its file under `public/fonts`. */
  readonly file: string;
  /** What people read in a list of fonts. */
  readonly name: string;
  /** `line`: strokes along the letters' middles, open paths to engrave along; `outline`: closed contours. */
  readonly kind: 'outline' | 'line';
  /** One sentence on what it is good for. */
  readonly note: string;
  readonly licence: string;
}

const OFL = 'SIL Open Font License 1.1';

const FONTS: Readonly<Record<FontId, Omit<CatalogueFont, 'id'>>> = {
  sans: {
    file: 'sans.ttf',
    name: 'Barlow Medium',
    kind: 'outline',
    note: 'Plain letters of even width; good for labels and pockets.',
    licence: OFL,
  },
  serif: {
    file: 'serif.ttf',
    name: 'EB Garamond SemiBold',
    kind: 'outline',
    note: 'Book letters with sharp serifs; made for a V-bit.',
    licence: OFL,
  },
  slab: {
    file: 'slab.ttf',
    name: 'Zilla Slab SemiBold',
    kind: 'outline',
    note: 'Square serifs; house numbers and signs.',
    licence: OFL,
  },
  script: {
    file: 'script.ttf',
    name: 'Pacifico',
    kind: 'outline',
    note: 'Joined brush writing; its letters overlap and are united.',
    licence: OFL,
  },
  stencil: {
    file: 'stencil.ttf',
    name: 'Saira Stencil One',
    kind: 'outline',
    note: 'Bridged letters whose middles stay in when cut through.',
    licence: OFL,
  },
  line: {
    file: 'line.json',
    name: 'Engraver’s line',
    kind: 'line',
    note: 'A single line of lines and arcs; for engraving with a point.',
    licence: 'Drawn for this project',
  },
};

/** Every font that text may name, in the order in which lists show them. */
export const FONT_CATALOGUE: readonly CatalogueFont[] = FONT_IDS.map((id) => ({ id, ...FONTS[id] }));

/** The catalogue's font of that id, or undefined. */
export function catalogueFont(id: string): CatalogueFont | undefined {
  return FONT_CATALOGUE.find((font) => font.id === id);
}
