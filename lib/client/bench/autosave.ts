import type { Job } from '@/lib/job/job-schema';

/**
 * What the header says of the document: `saved` only after the server has committed it; `device` while it is kept on
 * this device alone, with why; `conflict` when somebody else saved another version meanwhile.
 */
export type SaveState =
  | { readonly kind: 'saved' }
  | { readonly kind: 'saving' }
  | { readonly kind: 'device'; readonly why: string }
  | { readonly kind: 'conflict'; readonly theirs: Job; readonly version: number };

/** What became of one attempt to save. */
export type SaveOutcome =
  | { readonly kind: 'saved'; readonly version: number }
  | { readonly kind: 'conflict'; readonly theirs: Job; readonly version: number }
  /** The server refused the document: trying again as it is cannot help. */
  | { readonly kind: 'refused'; readonly why: string }
  /** The network or the server is away: worth trying again. */
  | { readonly kind: 'away'; readonly why: string };

export interface AutosaveHost {
  /** Saves `job` as the successor of `version`. */
  save(job: Job, version: number): Promise<SaveOutcome>;
  /** Keeps a copy on this device; resolves when it was written and read back. */
  keepDraft(job: Job, version: number): Promise<void>;
  dropDraft(): Promise<void>;
  onState(state: SaveState): void;
  /** Runs `task` after `ms`; gives a function that calls it off. */
  later(ms: number, task: () => void): () => void;
}

export interface Autosave {
  /** The document has changed. */
  changed(job: Job): void;
  /** Saves at once: the network came back, or the person asked. */
  now(): void;
  /** Goes on from `version`, which the person chose to take or to write over. */
  settle(version: number, job: Job | null): void;
  /** Whether something is not on the server yet. */
  pending(): boolean;
  stop(): void;
}

/** Quiet time after a change before it is sent: one gesture, one save. */
const QUIET = 700;
const FIRST_RETRY = 2000;
const LONGEST_RETRY = 30_000;

/** Saves the newest document, one request at a time, and tells the truth about it. Starts from a saved `version`. */
export function createAutosave(start: number, host: AutosaveHost): Autosave {
  let version = start;
  let waiting: Job | null = null;
  let busy = false;
  let blocked = false;
  let retry = FIRST_RETRY;
  let callOff: (() => void) | null = null;

  const plan = (ms: number): void => {
    callOff?.();
    callOff = host.later(ms, () => void send());
  };

  async function send(): Promise<void> {
    const job = waiting;
    if (!job || busy || blocked) return;
    busy = true;
    waiting = null;
    host.onState({ kind: 'saving' });
    const outcome = await host.save(job, version).catch((error: unknown): SaveOutcome => {
      return { kind: 'away', why: error instanceof Error ? error.message : 'The network is away.' };
    });
    busy = false;
    await take(outcome, job);
  }

  async function take(outcome: SaveOutcome, job: Job): Promise<void> {
    switch (outcome.kind) {
      case 'saved':
        version = outcome.version;
        retry = FIRST_RETRY;
        if (waiting) return plan(0);
        host.onState({ kind: 'saved' });
        return host.dropDraft();
      case 'conflict':
        waiting ??= job;
        blocked = true;
        return host.onState(outcome);
      case 'refused':
        // A newer change may be right again; this one stays on the device.
        if (waiting) return plan(QUIET);
        waiting = job;
        return host.onState({ kind: 'device', why: outcome.why });
      case 'away':
        waiting ??= job;
        host.onState({ kind: 'device', why: outcome.why });
        plan(retry);
        retry = Math.min(2 * retry, LONGEST_RETRY);
    }
  }

  return {
    changed(job) {
      waiting = job;
      void host.keepDraft(job, version).catch(() => undefined);
      if (blocked) return;
      if (!busy) host.onState({ kind: 'saving' });
      plan(QUIET);
    },
    now() {
      if (waiting) plan(0);
    },
    settle(newer, job) {
      version = newer;
      blocked = false;
      waiting = job;
      if (job) return plan(0);
      host.onState({ kind: 'saved' });
      void host.dropDraft();
    },
    pending: () => waiting !== null || busy,
    stop() {
      callOff?.();
      callOff = null;
    },
  };
}
