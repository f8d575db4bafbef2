import { NextRequest } from 'next/server';
import { encode } from 'next-auth/jwt';
import { randomUUID } from 'node:crypto';
import { readdirSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { type Endpoint, endpointHref } from '@/lib/contracts/endpoint';
import { Membership } from '@/entities/membership.entity';
import { ProjectMember } from '@/entities/project-member.entity';
import { Shop } from '@/entities/shop.entity';
import { User } from '@/entities/user.entity';
import type { ProjectRole, ShopRole } from '@/lib/contracts/roles';
import { hashPassword } from '@/lib/server/auth/password';
import { openSession } from '@/lib/server/auth/sessions';
import { sessionCookieName } from '@/lib/server/auth/session-cookie';
import { entityManager } from '@/lib/server/database';
import type { RouteHandler } from '@/lib/server/http/route';
import { TEST_ORIGIN, pointAtTestDatabase } from './test-database';

pointAtTestDatabase();

const root = fileURLToPath(new URL('../..', import.meta.url));

/** Every route file under app/api, as a path from the project's root with forward slashes. */
export function routeFiles(): string[] {
  return readdirSync(path.join(root, 'app/api'), { recursive: true, encoding: 'utf8' })
    .filter((file) => path.basename(file) === 'route.ts')
    .map((file) => `app/api/${file.split(path.sep).join('/')}`)
    .sort();
}

export function importRoute(file: string): Promise<Record<string, RouteHandler>> {
  return import(pathToFileURL(path.join(root, file)).href) as Promise<Record<string, RouteHandler>>;
}

/** Somebody with an account and an open session. */
export interface Actor {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly sessionId: string;
  readonly cookie: string;
}

export const TEST_PASSWORD = 'the same for every test account';
let testPasswordHash: Promise<string> | undefined;

/** Makes an account with {@link TEST_PASSWORD}, hashed once for all of them, and signs it in. */
export async function makeActor(name: string): Promise<Actor> {
  const passwordHash = await (testPasswordHash ??= hashPassword(TEST_PASSWORD));
  const id = randomUUID();
  const email = `${name.toLowerCase()}-${id.slice(0, 8)}@example.test`;
  const em = await entityManager();
  await em.insert(User, { id, name, email, passwordHash, createdAt: new Date() });
  return { id, email, name, ...(await signActorIn(id)) };
}

/** Opens one more session for an account. */
export async function signActorIn(userId: string): Promise<{ sessionId: string; cookie: string }> {
  const sessionId = await openSession(await entityManager(), userId, 'test browser');
  const token = await encode({ token: { sub: userId, sessionId }, secret: process.env.NEXTAUTH_SECRET! });
  return { sessionId, cookie: `${sessionCookieName()}=${token}` };
}

export async function putInProject(actor: Actor, projectId: string, role: ProjectRole): Promise<void> {
  const em = await entityManager();
  await em.insert(ProjectMember, { project: projectId, user: actor.id, role, addedAt: new Date() });
}

export async function makeShop(members: readonly [Actor, ShopRole][]): Promise<string> {
  const id = randomUUID();
  const em = await entityManager();
  await em.insert(Shop, { id, name: 'Test shop', createdAt: new Date() });
  for (const [actor, role] of members) {
    await em.insert(Membership, { shop: id, user: actor.id, role, addedAt: new Date() });
  }
  return id;
}

export interface CallParts {
  readonly params?: Readonly<Record<string, string | number>>;
  readonly query?: Readonly<Record<string, string | number | undefined>>;
  readonly body?: unknown;
  /** Added to or, where undefined, taken from what a browser on the same site would send. */
  readonly headers?: Readonly<Record<string, string | undefined>>;
}

/** Calls an endpoint's route handler as `actor` (null: nobody) as a page of the same site would. */
export async function call(
  actor: Pick<Actor, 'cookie'> | null,
  endpoint: Endpoint,
  parts: CallParts = {},
): Promise<Response> {
  const { params = {}, query, body, headers = {} } = parts;
  const file = `app${endpoint.path.replace(/\{(\w+)\}/g, '[$1]')}/route.ts`;
  const handler = (await importRoute(file))[endpoint.method];
  if (!handler) throw new Error(`${file} does not export ${endpoint.method}`);
  const all: Record<string, string | undefined> = {
    host: new URL(TEST_ORIGIN).host,
    ...(actor && { cookie: actor.cookie }),
    ...(endpoint.method !== 'GET' && { origin: TEST_ORIGIN, 'sec-fetch-site': 'same-origin' }),
    ...(body !== undefined && { 'content-type': 'application/json' }),
    ...headers,
  };
  const request = new NextRequest(`${TEST_ORIGIN}${endpointHref(endpoint, params, query)}`, {
    method: endpoint.method,
    headers: Object.entries(all).filter((pair): pair is [string, string] => pair[1] !== undefined),
    ...(body !== undefined && { body: typeof body === 'string' ? body : JSON.stringify(body) }),
  });
  const texts = Object.entries(params).map(([key, value]) => [key, String(value)]);
  // As Next does it: no parameters at all where the address has none.
  const given = texts.length > 0 ? Object.fromEntries(texts) : undefined;
  return handler(request, { params: Promise.resolve(given) });
}
