import 'server-only';
import { createHmac, randomUUID, timingSafeEqual } from 'node:crypto';
import { serverEnv } from '../env';
import { cookiesAreSecure } from './session-cookie';

/** A year: how long a browser counts as known to an account that it once signed in to. */
export const DEVICE_SECONDS = 365 * 24 * 3600;

export function deviceCookieName(): string {
  return cookiesAreSecure() ? '__Host-spindleaf-device' : 'spindleaf-device';
}

/** A cookie that says this browser has signed in to the account; it opens nothing by itself. */
export function deviceCookie(email: string): string {
  const id = randomUUID();
  return `${id}.${seal(id, email)}`;
}

/** The device that `cookie` names for this account, or null where it is another account's, forged or missing. */
export function knownDevice(cookie: string | undefined, email: string): string | null {
  const [id, mark] = cookie?.split('.') ?? [];
  if (!id || !mark) return null;
  const right = Buffer.from(seal(id, email));
  const given = Buffer.from(mark);
  return right.length === given.length && timingSafeEqual(right, given) ? id : null;
}

function seal(id: string, email: string): string {
  return createHmac('sha256', serverEnv().secret).update(`device:${id}:${email}`).digest('base64url');
}
