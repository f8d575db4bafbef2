import 'server-only';
import type { NextAuthOptions } from 'next-auth';
import Credentials from 'next-auth/providers/credentials';
import { cookies } from 'next/headers';
import { signInFields } from '@/lib/contracts/account';
import { entityManager } from '../database';
import { serverEnv } from '../env';
import { clientAddress } from '../http/client-address';
import { DEVICE_SECONDS, deviceCookie, deviceCookieName, knownDevice } from './device-cookie';
import { cookiesAreSecure, SESSION_SECONDS, sessionCookieName } from './session-cookie';
import { endSession, principalOf } from './sessions';
import { signIn } from './sign-in';

/** What the cookie carries besides `sub`, the account's id. */
declare module 'next-auth/jwt' {
  interface JWT {
    sessionId?: string;
  }
}

declare module 'next-auth' {
  interface User {
    sessionId: string;
  }
}

/** Shown by the sign-in page as `error=…` and given to `signIn({ redirect: false })` as `error`. */
export const SIGN_IN_ERRORS = { wrong: 'CredentialsSignin', wait: 'TooManyTries' } as const;

/**
 * next-auth with one provider. Its JWT only names a row of the sessions table, which is asked at every request: that is
 * how a session can be ended at once, which a JWT alone cannot.
 */
export function authOptions(): NextAuthOptions {
  const secure = cookiesAreSecure();
  return {
    secret: serverEnv().secret,
    session: { strategy: 'jwt', maxAge: SESSION_SECONDS },
    pages: { signIn: '/sign-in', error: '/sign-in' },
    useSecureCookies: secure,
    cookies: {
      sessionToken: {
        name: sessionCookieName(),
        options: { httpOnly: true, sameSite: 'lax', path: '/', secure },
      },
    },
    providers: [
      Credentials({
        name: 'E-mail and password',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        authorize: (credentials, request) => authorize(credentials, new Headers(request.headers ?? {})),
      }),
    ],
    callbacks: {
      async jwt({ token, user }) {
        if (user) return { sub: user.id, sessionId: user.sessionId };
        const { sub: userId, sessionId } = token;
        const open =
          userId && sessionId ? await principalOf(await entityManager(), { userId, sessionId }) : null;
        // next-auth takes a throw here for "no session" and clears the cookie.
        if (!open) throw new Error('The session has ended.');
        return { sub: open.userId, sessionId: open.sessionId, name: open.name, email: open.email };
      },
      session: ({ session, token }) => ({
        expires: session.expires,
        user: { name: token.name ?? null, email: token.email ?? null },
      }),
    },
    events: {
      async signOut({ token }) {
        const { sub: userId, sessionId } = token;
        if (!userId || !sessionId) return;
        const em = await entityManager();
        const principal = await principalOf(em, { userId, sessionId });
        if (principal) await endSession(em, principal, sessionId);
      },
    },
    logger: {
      // An ended session is an everyday thing, not an error.
      error: (code, detail) => {
        if (code !== 'JWT_SESSION_ERROR') console.error(`sign-in: ${code}`, detail);
      },
      warn: () => undefined,
      debug: () => undefined,
    },
  };
}

async function authorize(credentials: unknown, headers: Headers) {
  const fields = signInFields.safeParse(credentials);
  if (!fields.success) return null;
  const jar = await cookies();
  const source = {
    device: knownDevice(jar.get(deviceCookieName())?.value, fields.data.email),
    address: clientAddress(headers),
    browser: headers.get('user-agent') ?? '',
  };
  const outcome = await signIn(await entityManager(), fields.data, source);
  if (outcome.kind === 'wait') throw new Error(SIGN_IN_ERRORS.wait);
  if (outcome.kind === 'wrong') return null;
  const { userId, sessionId, name, email } = outcome.principal;
  if (source.device === null) {
    jar.set(deviceCookieName(), deviceCookie(email), {
      httpOnly: true,
      sameSite: 'lax',
      path: '/',
      secure: cookiesAreSecure(),
      maxAge: DEVICE_SECONDS,
    });
  }
  return { id: userId, sessionId, name, email };
}
