import { beforeAll, describe, expect, it } from 'vitest';
import { ENDPOINTS, type EndpointName } from '@/lib/contracts/endpoints';
import { type Endpoint, nothing } from '@/lib/contracts/endpoint';
import { requireSameOrigin } from '@/lib/server/http/same-origin';
import { type Actor, call, makeActor } from './api-client';
import { TEST_ORIGIN } from './test-database';

const changing = (Object.entries(ENDPOINTS) as [EndpointName, Endpoint][]).filter(
  ([, { method }]) => method !== 'GET',
);
const id = '00000000-0000-4000-8000-000000000000';
const params = { projectId: id, userId: id, commentId: id, sessionId: id, cutterId: id };

let actor: Actor;
beforeAll(async () => {
  actor = await makeActor('Checked');
});

describe('requests of other sites', () => {
  it.each(changing)('%s takes none', async (_, endpoint) => {
    const attempts: Record<string, string | undefined>[] = [
      { origin: 'https://elsewhere.test', 'sec-fetch-site': 'cross-site' },
      { origin: 'https://elsewhere.test', 'sec-fetch-site': undefined },
      { origin: 'null', 'sec-fetch-site': undefined },
      { origin: undefined, 'sec-fetch-site': undefined },
      { origin: TEST_ORIGIN, 'sec-fetch-site': 'same-site' },
    ];
    for (const headers of attempts) {
      const response = await call(actor, endpoint, {
        params,
        headers,
        body: endpoint.body === nothing ? undefined : {},
      });
      expect(response.status, JSON.stringify(headers)).toBe(403);
      expect(await response.json()).toMatchObject({ code: 'wrong-origin' });
    }
  });

  const host = 'localhost:3000';
  it.each([
    ['the public address', 'https://shop.test', { origin: 'https://shop.test', host: 'inner:3000' }, true],
    ['the public address of another port', 'https://shop.test', { origin: 'https://shop.test:8443' }, false],
    ['loopback by the Host header', 'http://127.0.0.1:3000', { origin: `http://${host}`, host }, true],
    ['loopback without a public address', null, { origin: `http://${host}`, host }, true],
    ['another loopback port', null, { origin: 'http://localhost:4000', host }, false],
    [
      'a name that matches Host but is not loopback',
      null,
      { origin: 'http://evil.test', host: 'evil.test' },
      false,
    ],
    ['the browser’s word without Origin', null, { 'sec-fetch-site': 'same-origin' }, true],
  ] as const)('%s', (_, publicOrigin, headers, allowed) => {
    const check = () => requireSameOrigin(new Headers(headers), publicOrigin);
    if (allowed) expect(check).not.toThrow();
    else expect(check).toThrow();
  });
});

describe('bodies', () => {
  const create = ENDPOINTS.createProject;
  const body = { from: 'empty', name: 'X' };

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data', undefined])(
    'are not taken as %s',
    async (type) => {
      const response = await call(actor, create, { body, headers: { 'content-type': type } });
      expect(response.status).toBe(415);
    },
  );

  it('must be JSON', async () => {
    expect((await call(actor, create, { body: '{"from":' })).status).toBe(400);
  });

  it('must not be larger than the endpoint takes, whatever Content-Length says', async () => {
    const large = JSON.stringify({ name: 'x'.repeat(70_000) });
    expect((await call(actor, ENDPOINTS.changeAccount, { body: large })).status).toBe(413);
    const headers = { 'content-length': '10' };
    expect((await call(actor, ENDPOINTS.changeAccount, { body: large, headers })).status).toBe(413);
  });

  it('may hold nothing that is not known', async () => {
    const response = await call(actor, ENDPOINTS.changeAccount, { body: { name: 'A', role: 'steward' } });
    expect(response.status).toBe(422);
    expect(await response.json()).toMatchObject({ problems: [{ path: 'role' }] });
  });

  it('cannot reach a prototype', async () => {
    const text = '{"name":"A","__proto__":{"role":"steward"}}';
    expect((await call(actor, ENDPOINTS.changeAccount, { body: text })).status).toBe(422);
    expect(({} as Record<string, unknown>).role).toBeUndefined();
  });
});

describe('addresses and queries', () => {
  it.each(['not-an-id', '1', '%00'])('an id that is none (%s) leads nowhere', async (projectId) => {
    expect((await call(actor, ENDPOINTS.getProject, { params: { projectId } })).status).toBe(404);
  });

  it.each([{ limit: 0 }, { limit: 'many' }, { unknown: 1 }, { cursor: 'made-up' }])(
    'a query that makes no sense is refused: %o',
    async (query) => {
      expect((await call(actor, ENDPOINTS.listProjects, { query })).status).toBe(422);
    },
  );
});
