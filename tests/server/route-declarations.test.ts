import { describe, expect, it } from 'vitest';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { importRoute, routeFiles } from './api-client';

/** next-auth brings its own checks; nothing else may be without a declaration. */
const UNDECLARED = ['app/api/auth/[...nextauth]/route.ts'];
const MAY_EXPORT = new Set(['GET', 'POST', 'PUT', 'PATCH', 'DELETE']);
const declared = routeFiles().filter((file) => !UNDECLARED.includes(file));

describe('every route file', () => {
  it.each(declared)('%s declares who may call it, under its own address', async (file) => {
    const handlers = Object.entries(await importRoute(file));
    expect(handlers.length).toBeGreaterThan(0);
    for (const [method, handler] of handlers) {
      expect(MAY_EXPORT, `${file} exports ${method}`).toContain(method);
      expect(handler.endpoint, `${method} of ${file} has no declaration`).toBeDefined();
      expect(handler.endpoint.method).toBe(method);
      expect(`app${handler.endpoint.path.replace(/\{(\w+)\}/g, '[$1]')}/route.ts`).toBe(file);
      expect(Object.values(ENDPOINTS)).toContain(handler.endpoint);
    }
  });

  it('and every endpoint of the contract has one', async () => {
    const served = new Set<unknown>();
    for (const file of declared) {
      for (const handler of Object.values(await importRoute(file))) served.add(handler.endpoint);
    }
    const unserved = Object.entries(ENDPOINTS).filter(([, endpoint]) => !served.has(endpoint));
    expect(unserved.map(([name]) => name)).toEqual([]);
  });

  it('but next-auth’s own, which is there and answers only GET and POST', async () => {
    expect(routeFiles()).toContain(UNDECLARED[0]);
    expect(Object.keys(await importRoute(UNDECLARED[0]!)).sort()).toEqual(['GET', 'POST']);
  });
});
