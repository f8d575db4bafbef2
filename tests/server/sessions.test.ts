import { describe, expect, it } from 'vitest';
import { Session } from '@/entities/session.entity';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { AccountSessions } from '@/lib/contracts/account';
import { signIn } from '@/lib/server/auth/sign-in';
import { deviceCookie, knownDevice } from '@/lib/server/auth/device-cookie';
import { entityManager } from '@/lib/server/database';
import { type Actor, call, makeActor, signActorIn, TEST_PASSWORD } from './api-client';

const NEW_PASSWORD = 'another that is long enough';

async function meStatus(actor: Pick<Actor, 'cookie'>): Promise<number> {
  return (await call(actor, ENDPOINTS.me)).status;
}

async function trySignIn(
  email: string,
  password: string,
  device: string | null = null,
  address = '192.0.2.1',
) {
  return (await signIn(await entityManager(), { email, password }, { device, address, browser: 'test' }))
    .kind;
}

describe('a session', () => {
  it('ends at once where it is ended from another', async () => {
    const actor = await makeActor('Two');
    const other = await signActorIn(actor.id);
    expect(await meStatus(other)).toBe(200);
    await call(actor, ENDPOINTS.endSession, { params: { sessionId: other.sessionId } });
    expect(await meStatus(other)).toBe(401);
    expect(await meStatus(actor)).toBe(200);
  });

  it('cannot be ended by somebody else', async () => {
    const [actor, stranger] = [await makeActor('Mine'), await makeActor('Stranger')];
    const params = { sessionId: actor.sessionId };
    expect((await call(stranger, ENDPOINTS.endSession, { params })).status).toBe(404);
    expect(await meStatus(actor)).toBe(200);
  });

  it('ends everywhere with sign out everywhere', async () => {
    const actor = await makeActor('Everywhere');
    const other = await signActorIn(actor.id);
    await call(actor, ENDPOINTS.signOutEverywhere);
    expect([await meStatus(actor), await meStatus(other)]).toEqual([401, 401]);
  });

  it.each([
    ['too old', { expiresAt: new Date(Date.now() - 1000) }],
    ['unused for too long', { lastSeenAt: new Date(Date.now() - 15 * 24 * 3600_000) }],
  ])('does not hold when it is %s', async (_, change) => {
    const actor = await makeActor('Old');
    await (await entityManager()).nativeUpdate(Session, { id: actor.sessionId }, change);
    expect(await meStatus(actor)).toBe(401);
  });

  it('is not made by a cookie with somebody else’s session or a broken one', async () => {
    const actor = await makeActor('Real');
    const broken = { cookie: actor.cookie.slice(0, -3) + 'abc' };
    expect(await meStatus(broken)).toBe(401);
    const other = await makeActor('Other');
    const { encode } = await import('next-auth/jwt');
    const mixed = await encode({
      token: { sub: actor.id, sessionId: other.sessionId },
      secret: process.env.NEXTAUTH_SECRET!,
    });
    expect(await meStatus({ cookie: `${actor.cookie.split('=')[0]}=${mixed}` })).toBe(401);
  });

  it('is listed with the one that asks marked', async () => {
    const actor = await makeActor('Lister');
    await signActorIn(actor.id);
    const { items } = (await (await call(actor, ENDPOINTS.listSessions)).json()) as AccountSessions;
    expect(items).toHaveLength(2);
    expect(items.filter(({ current }) => current).map(({ id }) => id)).toEqual([actor.sessionId]);
  });
});

describe('changing the password', () => {
  it('ends every other session and makes the old one useless', async () => {
    const actor = await makeActor('Changer');
    const other = await signActorIn(actor.id);
    const body = { current: TEST_PASSWORD, next: NEW_PASSWORD };
    expect((await call(actor, ENDPOINTS.changePassword, { body })).status).toBe(204);
    expect([await meStatus(actor), await meStatus(other)]).toEqual([200, 401]);
    expect(await trySignIn(actor.email, TEST_PASSWORD)).toBe('wrong');
    expect(await trySignIn(actor.email, NEW_PASSWORD)).toBe('signed-in');
  });

  it('is no way to guess the present one', async () => {
    const actor = await makeActor('Guessed');
    const attempt = () =>
      call(actor, ENDPOINTS.changePassword, { body: { current: 'a wrong guess', next: NEW_PASSWORD } });
    const statuses: number[] = [];
    for (let n = 0; n < 11; n++) statuses.push((await attempt()).status);
    expect(statuses).toEqual([...Array<number>(10).fill(403), 429]);
  });
});

describe('signing in', () => {
  it('gives the same answer for a wrong password and an unknown address', async () => {
    const actor = await makeActor('Known');
    expect(await trySignIn(actor.email, 'wrong')).toBe('wrong');
    expect(await trySignIn(`nobody-${actor.email}`, 'wrong')).toBe('wrong');
  });

  it('makes a guesser wait, from whatever address, but never a browser the owner has used', async () => {
    const actor = await makeActor('Target');
    for (let n = 0; n < 10; n++) await trySignIn(actor.email, `guess ${n}`, null, `192.0.2.${n}`);
    expect(await trySignIn(actor.email, TEST_PASSWORD, null, '192.0.2.99')).toBe('wait');
    const device = knownDevice(deviceCookie(actor.email), actor.email);
    expect(device).not.toBeNull();
    expect(await trySignIn(actor.email, TEST_PASSWORD, device)).toBe('signed-in');
    expect(await trySignIn(actor.email, 'guess', null, '192.0.2.99')).toBe('wait');
  });

  it('takes a device cookie for the account that it was made for alone', () => {
    const cookie = deviceCookie('one@example.test');
    expect(knownDevice(cookie, 'one@example.test')).not.toBeNull();
    expect(knownDevice(cookie, 'two@example.test')).toBeNull();
    expect(knownDevice(`${cookie}x`, 'one@example.test')).toBeNull();
    expect(knownDevice(undefined, 'one@example.test')).toBeNull();
  });
});

describe('signing up', () => {
  const account = () => ({
    email: `New-${crypto.randomUUID()}@Example.Test`,
    name: 'New',
    password: NEW_PASSWORD,
  });

  it('makes an account that can sign in, with a shop that has cutters', async () => {
    const body = account();
    const made = await call(null, ENDPOINTS.signUp, { body });
    expect(made.status).toBe(201);
    expect(await made.json()).toMatchObject({
      email: body.email.toLowerCase(),
      shops: [{ role: 'steward' }],
    });
    expect(await trySignIn(body.email.toLowerCase(), NEW_PASSWORD)).toBe('signed-in');
  });

  it('refuses an address that is taken, whatever its case', async () => {
    const body = account();
    await call(null, ENDPOINTS.signUp, { body });
    const again = await call(null, ENDPOINTS.signUp, { body: { ...body, email: body.email.toUpperCase() } });
    expect(again.status).toBe(409);
    expect(await again.json()).toMatchObject({ code: 'email-taken' });
  });

  it('names what is wrong without repeating the password', async () => {
    const response = await call(null, ENDPOINTS.signUp, { body: { ...account(), password: 'tooshort!' } });
    expect(response.status).toBe(422);
    const text = await response.text();
    expect(text).toContain('must have at least 12 characters');
    expect(text).not.toContain('tooshort!');
  });
});
