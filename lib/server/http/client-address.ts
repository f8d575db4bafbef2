import 'server-only';

/**
 * The network address a request comes from: the last entry of X-Forwarded-For, which the nearest proxy, or Next itself
 * where there is none, has put there. Earlier entries are whatever the client wrote.
 */
export function clientAddress(headers: Headers): string {
  const entries = headers.get('x-forwarded-for')?.split(',') ?? [];
  return entries.at(-1)?.trim() || 'unknown';
}
