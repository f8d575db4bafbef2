import { fail, ok } from '@/lib/base/result';
import { importSvg } from '@/lib/import/svg/import-svg';
import type { ReadDrawing } from './drawing';

/** Reads an SVG file as outlines. */
export const readDrawing: ReadDrawing = (text, { scale, at }) => {
  const read = importSvg(text, { scale, at });
  if (!read.ok) return fail(`Line ${read.error.line}: ${read.error.message}`);
  const { outlines, size, leftOut } = read.value;
  return ok({ outlines, size, leftOut: leftOut.map(({ line, what }) => ({ what, where: `line ${line}` })) });
};
