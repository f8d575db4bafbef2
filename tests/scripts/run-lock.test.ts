import { spawn, spawnSync } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { birthMark } from '@/scripts/setup/process-identity.mjs';
import { announce, liveHolder, readLock, releaseLock, takeLock } from '@/scripts/setup/run-lock.mjs';

let folder: string;
let file: string;

beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'lock-'));
  file = path.join(folder, 'running.json');
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

/** The number of a process that has ended. */
function deadProcess(): number {
  return spawnSync(process.execPath, ['-e', '']).pid;
}

function writeLock(holder: { pid: number; birth: string | null }): void {
  writeFileSync(file, JSON.stringify({ ...holder, command: 'npm start', address: 'http://127.0.0.1:3000' }));
}

describe('the lock of a run', () => {
  it('is taken when there is none, and leaves no other file behind', () => {
    expect(takeLock(file, 'npm start')).toEqual({ taken: true });
    expect(readLock(file)).toMatchObject({ pid: process.pid, command: 'npm start', address: null });
    expect(readdirSync(folder)).toEqual(['running.json']);
  });

  it('tells who holds it and where that run answers', async () => {
    const other = spawn(process.execPath, ['-e', 'setTimeout(() => {}, 60000)']);
    try {
      writeLock({ pid: other.pid ?? 0, birth: birthMark(other.pid ?? 0) });
      expect(takeLock(file, 'npm run dev')).toEqual({
        taken: false,
        holder: expect.objectContaining({ pid: other.pid, address: 'http://127.0.0.1:3000' }),
      });
    } finally {
      other.kill('SIGKILL');
      await once(other, 'close');
    }
  });

  it('is taken over from a process that was killed', () => {
    writeLock({ pid: deadProcess(), birth: null });
    expect(liveHolder(file)).toBeNull();
    expect(takeLock(file, 'npm start')).toEqual({ taken: true });
    expect(readdirSync(folder)).toEqual(['running.json']);
  });

  it('is taken over when its process number has gone to another process', () => {
    writeLock({ pid: process.ppid, birth: 'another boot/1' });
    expect(takeLock(file, 'npm start')).toEqual({ taken: true });
  });

  it.each(['', '{"pid": 12'])('is taken over when it was cut short: %j', (text) => {
    writeFileSync(file, text);
    expect(takeLock(file, 'npm start')).toEqual({ taken: true });
  });

  it('says where the run answers, and goes with it', () => {
    takeLock(file, 'npm start');
    announce(file, 'http://127.0.0.1:3001');
    expect(liveHolder(file)?.address).toBe('http://127.0.0.1:3001');
    releaseLock(file);
    expect(readdirSync(folder)).toEqual([]);
  });

  it('stays when it is not ours to release', () => {
    writeLock({ pid: process.ppid, birth: birthMark(process.ppid) });
    releaseLock(file);
    announce(file, 'http://127.0.0.1:3001');
    expect(readLock(file)).toMatchObject({ pid: process.ppid, address: 'http://127.0.0.1:3000' });
  });

  it('goes to exactly one of several that find the same dead lock', async () => {
    writeLock({ pid: deadProcess(), birth: null });
    const lockModule = fileURLToPath(new URL('../../scripts/setup/run-lock.mjs', import.meta.url));
    // Each contender lives on until all have tried, or its own lock would be a dead one to the next.
    const script = `
      const { takeLock } = await import(${JSON.stringify(lockModule)});
      console.log(takeLock(${JSON.stringify(file)}, 'npm start').taken);
      process.stdin.resume();`;
    const contenders = Array.from({ length: 6 }, () =>
      spawn(process.execPath, ['--input-type=module', '-e', script], { stdio: ['pipe', 'pipe', 'inherit'] }),
    );
    const answers = await Promise.all(
      contenders.map(async ({ stdout }) => String((await once(stdout, 'data'))[0]).trim()),
    );
    await Promise.all(
      contenders.map((contender) => {
        contender.stdin.end();
        return once(contender, 'close');
      }),
    );
    expect(answers.filter((answer) => answer === 'true')).toHaveLength(1);
  });
});
