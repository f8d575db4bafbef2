import 'server-only';
import { ApiError } from './api-error';

const LOOPBACK = /^(localhost|127(?:\.\d{1,3}){3}|\[::1\])$/;

/**
 * Refuses a request that another site's page may have made. Cookies go along with such requests, so every
 * state-changing route asks: the browser's own word (`Sec-Fetch-Site`) first, else `Origin`, and where neither is there,
 * no. `publicOrigin` is the address people type; on plain loopback the Host header tells it as well.
 */
export function requireSameOrigin(headers: Headers, publicOrigin: string | null): void {
  const site = headers.get('sec-fetch-site');
  const origin = headers.get('origin');
  if (site !== null && site !== 'same-origin') throw foreign();
  if (origin === null ? site !== 'same-origin' : !isOwnOrigin(origin, headers.get('host'), publicOrigin)) {
    throw foreign();
  }
}

function isOwnOrigin(origin: string, host: string | null, publicOrigin: string | null): boolean {
  if (publicOrigin !== null && origin === publicOrigin) return true;
  if (!URL.canParse(origin)) return false; // "null" among them
  const { hostname, host: originHost, protocol } = new URL(origin);
  return protocol === 'http:' && LOOPBACK.test(hostname) && originHost === host;
}

function foreign(): ApiError {
  return new ApiError('wrong-origin', 'Changes are taken from pages of this site only.');
}
