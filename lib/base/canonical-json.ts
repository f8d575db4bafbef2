/**
 * Canonical JSON (RFC 8785): keys sorted by UTF-16 code units, no white space, numbers and strings as ECMAScript
 * writes them. Two documents that mean the same give the same text, so its hash names the document.
 *
 * @throws TypeError on NaN, infinities, functions, symbols and bigints, which JSON cannot carry.
 */
export function canonicalJson(value: unknown): string {
  if (value === null || typeof value === 'boolean' || typeof value === 'string') return JSON.stringify(value);
  if (typeof value === 'number') return canonicalNumber(value);
  if (Array.isArray(value)) return `[${value.map((item) => canonicalJson(item ?? null)).join(',')}]`;
  if (typeof value === 'object') return canonicalObject(value as Record<string, unknown>);
  throw new TypeError(`Cannot write a ${typeof value} as JSON.`);
}

function canonicalNumber(value: number): string {
  if (!Number.isFinite(value)) throw new TypeError(`Cannot write ${value} as JSON.`);
  // JSON.stringify is ECMAScript's Number::toString, which RFC 8785 prescribes; it writes -0 as 0.
  return JSON.stringify(value);
}

function canonicalObject(object: Record<string, unknown>): string {
  const members = Object.keys(object)
    .filter((key) => object[key] !== undefined)
    .sort() // default order compares UTF-16 code units, as RFC 8785 3.2.3 asks
    .map((key) => `${JSON.stringify(key)}:${canonicalJson(object[key])}`);
  return `{${members.join(',')}}`;
}
