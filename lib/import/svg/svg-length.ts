/** User units (CSS px) in a unit: 96 px are an inch of 25.4 mm (CSS Values and Units 4, section 6.2). */
const PX_PER_UNIT: Readonly<Record<string, number>> = {
  '': 1,
  px: 1,
  in: 96,
  mm: 96 / 25.4,
  cm: 960 / 25.4,
  q: 96 / 101.6,
  pt: 96 / 72,
  pc: 16,
};

/** mm in a CSS px. */
export const MM_PER_PX = 25.4 / 96;
/** What em and ex are taken for where no font is known: the initial font size of CSS, and half of it. */
const EM = 16;

const LENGTH = /^\s*([+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)\s*([a-zA-Z%]*)\s*$/;

/** A length as number and unit (`mm`, `%`, empty for user units), or null where it is none. */
export function splitLength(text: string | undefined): { value: number; unit: string } | null {
  const found = LENGTH.exec(text ?? '');
  if (!found) return null;
  const unit = (found[2] ?? '').toLowerCase();
  const isKnown = unit in PX_PER_UNIT || unit === '%' || unit === 'em' || unit === 'ex';
  return isKnown ? { value: Number(found[1]), unit } : null;
}

/** A length in user units; a percentage of `whole`; null where it is none. */
export function userLength(text: string | undefined, whole: number): number | null {
  const length = splitLength(text);
  if (!length) return null;
  if (length.unit === '%') return (length.value / 100) * whole;
  if (length.unit === 'em') return length.value * EM;
  if (length.unit === 'ex') return (length.value * EM) / 2;
  return length.value * (PX_PER_UNIT[length.unit] ?? 1);
}
