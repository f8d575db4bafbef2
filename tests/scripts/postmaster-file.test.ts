import { describe, expect, it } from 'vitest';
import { parsePostmaster } from '@/scripts/setup/postmaster-file.mjs';

const STARTING = ['4711', '/srv/data', '1796125673', '54310', '', '127.0.0.1', ' 54310001    163840'];

describe('postmaster.pid', () => {
  it('tells a server that is ready from one that is still starting', () => {
    expect(parsePostmaster([...STARTING, 'ready   ', ''].join('\n'))).toEqual({
      pid: 4711,
      port: 54310,
      ready: true,
    });
    expect(parsePostmaster([...STARTING, 'starting', ''].join('\n'))?.ready).toBe(false);
  });

  it('is of use from its first line on', () => {
    expect(parsePostmaster('4711\n')).toEqual({ pid: 4711, port: null, ready: false });
  });

  it.each(['', 'garbage', '-4711\n', '0'])('gives nothing for %j', (text) => {
    expect(parsePostmaster(text)).toBeNull();
  });
});
