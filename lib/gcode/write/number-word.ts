/**
 * Numbers of words are integers of the last decimal from the moment they are rounded: what is compared is what is
 * written, so no move is lost or doubled by rounding.
 */
export interface NumberFormat {
  readonly decimals: number;
  /** Millimetres in one unit of the program: 1, or 25.4. */
  readonly unit: number;
}

/** A length in mm as an integer of the last decimal. */
export function toSteps(mm: number, { decimals, unit }: NumberFormat): number {
  const steps = Math.round((mm / unit) * 10 ** decimals);
  return steps === 0 ? 0 : steps;
}

/** The length of so many steps, mm. */
export function fromSteps(steps: number, { decimals, unit }: NumberFormat): number {
  return (steps / 10 ** decimals) * unit;
}

/** A coordinate word: always with a point and at least one decimal, never an exponent, never −0. */
export function coordinateWord(letter: string, steps: number, { decimals }: NumberFormat): string {
  const digits = String(Math.abs(steps)).padStart(decimals + 1, '0');
  const whole = digits.slice(0, -decimals);
  const fraction = digits.slice(-decimals).replace(/0+$/, '');
  return `${letter}${steps < 0 ? '-' : ''}${whole}.${fraction === '' ? '0' : fraction}`;
}

/** A feed or a time: as many decimals as count, none that are 0. */
export function plainWord(letter: string, value: number, decimals: number): string {
  const text = value.toFixed(decimals);
  return letter + (text.includes('.') ? text.replace(/\.?0+$/, '') : text);
}
