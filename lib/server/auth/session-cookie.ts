import 'server-only';
import { decode } from 'next-auth/jwt';
import { serverEnv } from '../env';

/** Sessions end this long after sign-in, seconds; and earlier after {@link SESSION_IDLE_SECONDS} without use. */
export const SESSION_SECONDS = 60 * 24 * 3600;
export const SESSION_IDLE_SECONDS = 14 * 24 * 3600;

/** What the signed and encrypted cookie says; that the session still holds is another question. */
export interface SessionClaim {
  readonly userId: string;
  readonly sessionId: string;
}

export function cookiesAreSecure(): boolean {
  return serverEnv().origin?.startsWith('https://') ?? false;
}

/** `__Host-` binds the cookie to this very host and to https; plain loopback cannot have it. */
export function sessionCookieName(): string {
  return cookiesAreSecure() ? '__Host-spindleaf-session' : 'spindleaf-session';
}

/** What a session cookie's value claims, or null where it is not ours or too old. */
export async function readSessionCookie(value: string | undefined): Promise<SessionClaim | null> {
  if (!value) return null;
  try {
    const token = await decode({ token: value, secret: serverEnv().secret });
    const { sub, sessionId } = token ?? {};
    return typeof sub === 'string' && typeof sessionId === 'string' ? { userId: sub, sessionId } : null;
  } catch {
    return null; // forged, damaged or out of date: all the same to us
  }
}

/** The value of a cookie in a Cookie header. */
export function cookieValue(header: string | null, name: string): string | undefined {
  for (const pair of header?.split(';') ?? []) {
    const at = pair.indexOf('=');
    if (at > 0 && pair.slice(0, at).trim() === name) return decodeURIComponent(pair.slice(at + 1).trim());
  }
  return undefined;
}
