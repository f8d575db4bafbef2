import { sha256Hex } from '@/lib/base/sha256';

/** Digits and letters that nobody reads for one another (no I, L, O, U). */
const LETTERS = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';
const LENGTH = 6;

/** Stands for the code while the text is hashed. */
export const CHECK_PLACE = '------';

/**
 * Six characters from the hash of a program's text in which the code's own place holds dashes: enough that the person
 * at the machine can tell this file from every other that they might have taken up.
 */
export function checkCode(textWithPlace: string): string {
  const hash = sha256Hex(textWithPlace);
  const bits = BigInt(`0x${hash.slice(0, 8)}`) >> 2n;
  let code = '';
  for (let i = LENGTH - 1; i >= 0; i--) code += LETTERS.charAt(Number((bits >> BigInt(5 * i)) & 31n));
  return code;
}

/** Puts the code into the first place that was kept for it. */
export function withCheckCode(textWithPlace: string): string {
  return textWithPlace.replace(CHECK_PLACE, checkCode(textWithPlace));
}
