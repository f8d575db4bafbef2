import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { readFileSync } from 'node:fs';
import { describe, expect, it, vi } from 'vitest';
import { birthMark, isAlive, parseStat } from '@/scripts/setup/process-identity.mjs';

describe('telling processes apart', () => {
  it.each([0, -1, 1.5, Number.NaN])('takes %d for no process at all', (pid) => {
    expect(isAlive(pid)).toBe(false);
  });

  it('knows a running process, and one mark for its whole life', () => {
    expect(isAlive(process.pid)).toBe(true);
    expect(birthMark(process.pid)).toBe(birthMark(process.pid));
    expect(birthMark(process.pid)).not.toBe(birthMark(process.ppid));
  });

  it('takes an ended process that nobody has buried for dead', async () => {
    // The shell's child ends at once; the program that the shell turns into never asks after it.
    const shell = spawn('sh', ['-c', 'sh -c "echo \\$\\$" & exec sleep 30'], {
      stdio: ['ignore', 'pipe', 'ignore'],
    });
    try {
      const child = Number(String((await once(shell.stdout, 'data'))[0]));
      await vi.waitFor(() => expect(readFileSync(`/proc/${child}/stat`, 'utf8')).toMatch(/\) Z /));
      expect(isAlive(child)).toBe(false);
    } finally {
      shell.kill('SIGKILL');
    }
  });

  // The layout of the line: proc(5), /proc/pid/stat, field 22.
  it.each(['node', 'a b', 'odd) R 1 2 (name'])('reads state and start of a process called %j', (name) => {
    const after = ['Z', ...Array.from({ length: 18 }, (_, index) => String(index + 4)), '987654', '0', '0'];
    expect(parseStat(`4242 (${name}) ${after.join(' ')}`)).toEqual({ state: 'Z', startTicks: '987654' });
  });
});
