import { describe, expect, it, vi } from 'vitest';
import { createAutosave, type SaveOutcome, type SaveState } from '@/lib/client/bench/autosave';
import type { Job } from '@/lib/job/job-schema';

/** Documents are only handed on; a name tells them apart. */
const job = (name: string): Job => ({ name }) as Job;

function bench(outcomes: SaveOutcome[]) {
  const states: SaveState['kind'][] = [];
  const sent: [string, number][] = [];
  const kept: string[] = [];
  const tasks: (() => void)[] = [];
  const autosave = createAutosave(1, {
    save: async ({ name }, version) => {
      sent.push([name, version]);
      return outcomes.shift() ?? { kind: 'away', why: 'no answer planned' };
    },
    keepDraft: async ({ name }) => void kept.push(name),
    dropDraft: async () => void kept.push('-'),
    onState: ({ kind }) => states.push(kind),
    later(_ms, task) {
      tasks.push(task);
      return () => void tasks.splice(tasks.indexOf(task), 1);
    },
  });
  /** Lets planned tasks and their promises run. */
  const pass = async (): Promise<void> => {
    tasks.splice(0).forEach((task) => task());
    await vi.waitFor(() => undefined);
    await new Promise((resolve) => setTimeout(resolve, 0));
  };
  return { autosave, states, sent, kept, pass };
}

describe('autosave', () => {
  it('says saved only after the server has committed, and drops the draft then', async () => {
    const { autosave, states, sent, kept, pass } = bench([{ kind: 'saved', version: 2 }]);
    autosave.changed(job('a'));
    expect(states).toEqual(['saving']);
    expect(kept).toEqual(['a']);
    await pass();
    expect(sent).toEqual([['a', 1]]);
    expect(states.at(-1)).toBe('saved');
    expect(kept).toEqual(['a', '-']);
    expect(autosave.pending()).toBe(false);
  });

  it('sends the newest of several quick changes once, on the version it stands on', async () => {
    const { autosave, sent, pass } = bench([
      { kind: 'saved', version: 2 },
      { kind: 'saved', version: 3 },
    ]);
    autosave.changed(job('a'));
    autosave.changed(job('b'));
    await pass();
    autosave.changed(job('c'));
    await pass();
    expect(sent).toEqual([
      ['b', 1],
      ['c', 2],
    ]);
  });

  it('keeps the change on the device while the network is away, and saves it when it is back', async () => {
    const { autosave, states, sent, pass } = bench([
      { kind: 'away', why: 'The server cannot be reached.' },
      { kind: 'saved', version: 2 },
    ]);
    autosave.changed(job('a'));
    await pass();
    expect(states.at(-1)).toBe('device');
    expect(autosave.pending()).toBe(true);
    autosave.now();
    await pass();
    expect(sent).toHaveLength(2);
    expect(states.at(-1)).toBe('saved');
  });

  it('stops at a conflict until the person has chosen', async () => {
    const { autosave, states, sent, pass } = bench([
      { kind: 'conflict', theirs: job('theirs'), version: 5 },
      { kind: 'saved', version: 6 },
    ]);
    autosave.changed(job('a'));
    await pass();
    autosave.changed(job('b'));
    await pass();
    expect(states.at(-1)).toBe('conflict');
    expect(sent).toHaveLength(1);
    autosave.settle(5, job('b'));
    await pass();
    expect(sent.at(-1)).toEqual(['b', 5]);
    expect(states.at(-1)).toBe('saved');
  });

  it('does not try a refused document again, but the next change', async () => {
    const { autosave, states, sent, pass } = bench([
      { kind: 'refused', why: 'board.x must be above 0.' },
      { kind: 'saved', version: 2 },
    ]);
    autosave.changed(job('bad'));
    await pass();
    expect(states.at(-1)).toBe('device');
    autosave.changed(job('good'));
    await pass();
    expect(sent).toEqual([
      ['bad', 1],
      ['good', 1],
    ]);
    expect(states.at(-1)).toBe('saved');
  });
});
