/**
 * Ends a switch over a closed union: a forgotten member is a compile error here, and a value that got past the
 * compiler throws with what it was.
 */
export function assertNever(value: never, what = 'value'): never {
  throw new Error(`Unexpected ${what}: ${JSON.stringify(value)}`);
}
