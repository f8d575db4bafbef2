import { createServer, type Server } from 'node:net';
import { afterEach, describe, expect, it } from 'vitest';
import { firstFreePort, isFree } from '@/scripts/setup/free-port.mjs';

const servers: Server[] = [];

/** Listens on loopback or on every address; port 0 lets the system choose. */
function listen(port: number, host: string): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    servers.push(server);
    server.once('error', reject);
    server.listen(port, host, () => {
      const address = server.address();
      resolve(typeof address === 'object' && address !== null ? address.port : 0);
    });
  });
}

afterEach(async () => {
  await Promise.all(servers.splice(0).map((server) => new Promise((resolve) => server.close(resolve))));
});

describe('the first free port', () => {
  it('passes over a port that somebody listens on', async () => {
    const taken = await listen(0, '127.0.0.1');
    expect(await isFree(taken)).toBe(false);
    expect(await firstFreePort(taken)).toBeGreaterThan(taken);
  });

  it('counts a port as taken that is open on all addresses', async () => {
    expect(await isFree(await listen(0, '0.0.0.0'))).toBe(false);
  });

  it('leaves the port that it gives free to listen on', async () => {
    const port = await firstFreePort(43_210);
    expect(await listen(port, '127.0.0.1')).toBe(port);
  });

  it('says which ports it tried when there is none', async () => {
    await listen(65_535, '127.0.0.1').catch(() => undefined);
    await expect(firstFreePort(65_535)).rejects.toThrow('from 65535 to 65535');
  });
});
