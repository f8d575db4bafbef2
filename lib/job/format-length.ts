import type { DisplayUnit } from './job-schema';
import { MM_PER_INCH } from './parse-length';

/** A length as people read it, without its unit: up to 3 decimals of a millimetre, 4 of an inch, none that are 0. */
export function formatLength(mm: number, unit: DisplayUnit): string {
  return plainNumber(unit === 'in' ? mm / MM_PER_INCH : mm, unit === 'in' ? 4 : 3);
}

/** The same with its unit: `6.35 mm`, `0.25 in`. */
export function lengthWithUnit(mm: number, unit: DisplayUnit): string {
  return `${formatLength(mm, unit)} ${unit}`;
}

/** A length as a drawing gives it: one decimal of a millimetre, three of an inch. */
export function drawingLength(mm: number, unit: DisplayUnit): string {
  return unit === 'in' ? (mm / MM_PER_INCH).toFixed(3) : mm.toFixed(1);
}

/** A number with at most `decimals` places, trailing zeros and minus zero left out. */
export function plainNumber(value: number, decimals: number): string {
  const text = value.toFixed(decimals);
  const short = text.includes('.') ? text.replace(/\.?0+$/, '') : text;
  return short === '-0' ? '0' : short;
}

/** Minutes and seconds of a time at the machine: `0:45`, `12:05`, `1:02:40`. */
export function clockTime(seconds: number): string {
  const whole = Math.round(seconds);
  const pad = (value: number): string => String(value).padStart(2, '0');
  const minutes = Math.floor(whole / 60);
  if (minutes < 60) return `${minutes}:${pad(whole % 60)}`;
  return `${Math.floor(minutes / 60)}:${pad(minutes % 60)}:${pad(whole % 60)}`;
}
