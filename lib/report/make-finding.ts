import { FINDING_CODES, type FindingCode } from './finding-codes';
import type { Finding } from './report';

/** A finding of `code` with the severity that belongs to it. `message` is a whole sentence with names and figures. */
export function makeFinding(
  code: FindingCode,
  message: string,
  where: { cut?: string; face?: 'A' | 'B'; at?: readonly [number, number] } = {},
): Finding {
  return { severity: FINDING_CODES[code].severity, code, ...where, message };
}
