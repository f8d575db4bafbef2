import { MM_PER_INCH } from '@/lib/job/parse-length';

/** A length as it is read on the board: `480`, `18.5`, `3.54`; the unit is written once, after the last. */
export function boardSizeText(board: { x: number; y: number; z: number }, unit: 'mm' | 'in' = 'mm'): string {
  const figure = (mm: number) =>
    unit === 'mm' ? String(Math.round(mm * 10) / 10) : String(Math.round((mm / MM_PER_INCH) * 1000) / 1000);
  return `${figure(board.x)} × ${figure(board.y)} × ${figure(board.z)} ${unit}`;
}

/** A length in mm as text for a field in `unit`, without digits that say nothing. */
export function lengthText(mm: number, unit: 'mm' | 'in'): string {
  return String(
    unit === 'mm' ? Math.round(mm * 100) / 100 : Math.round((mm / MM_PER_INCH) * 10_000) / 10_000,
  );
}
