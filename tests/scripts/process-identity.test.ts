import { describe, expect, it } from 'vitest';
import { birthMark, isAlive, startTicks } from '@/scripts/setup/process-identity.mjs';

describe('telling processes apart', () => {
  it.each([0, -1, 1.5, Number.NaN])('takes %d for no process at all', (pid) => {
    expect(isAlive(pid)).toBe(false);
  });

  it('knows a running process, and one mark for its whole life', () => {
    expect(isAlive(process.pid)).toBe(true);
    expect(birthMark(process.pid)).toBe(birthMark(process.pid));
    expect(birthMark(process.pid)).not.toBe(birthMark(process.ppid));
  });

  // The layout of the line: proc(5), /proc/pid/stat, field 22.
  it.each(['node', 'a b', 'odd) R 1 2 (name'])('reads the start of a process called %j', (name) => {
    const after = ['S', ...Array.from({ length: 18 }, (_, index) => String(index + 4)), '987654', '0', '0'];
    expect(startTicks(`4242 (${name}) ${after.join(' ')}`)).toBe('987654');
  });
});
