import type { Job } from '@/lib/job/job-schema';
import { parseJob } from '@/lib/job/parse-job';

/** What this device keeps of a project whose newest change the server may not have. */
export interface LocalDraft {
  readonly job: Job;
  /** The server's version that the change was made on. */
  readonly version: number;
}

const DATABASE = 'spindleaf-drafts';
const STORE = 'drafts';

/** The draft of a project, or null where there is none or it cannot be read. */
export async function readDraft(projectId: string): Promise<LocalDraft | null> {
  const found = await inStore('readonly', (store) => store.get(projectId));
  if (typeof found !== 'object' || found === null || !('job' in found) || !('version' in found)) return null;
  const job = parseJob(found.job);
  return job.ok && typeof found.version === 'number' ? { job: job.value, version: found.version } : null;
}

/** Writes the draft; resolves once the browser's database has committed it. */
export async function writeDraft(projectId: string, draft: LocalDraft): Promise<void> {
  await inStore('readwrite', (store) => store.put(draft, projectId));
}

export async function deleteDraft(projectId: string): Promise<void> {
  await inStore('readwrite', (store) => store.delete(projectId));
}

async function inStore(
  mode: IDBTransactionMode,
  ask: (store: IDBObjectStore) => IDBRequest,
): Promise<unknown> {
  const database = await openDatabase();
  try {
    return await new Promise<unknown>((resolve, reject) => {
      const transaction = database.transaction(STORE, mode, { durability: 'strict' });
      const request = ask(transaction.objectStore(STORE));
      transaction.oncomplete = () => resolve(request.result);
      transaction.onerror = () => reject(transaction.error ?? new Error('The draft could not be kept.'));
      transaction.onabort = () => reject(transaction.error ?? new Error('The draft could not be kept.'));
    });
  } finally {
    database.close();
  }
}

function openDatabase(): Promise<IDBDatabase> {
  return new Promise((resolve, reject) => {
    const request = indexedDB.open(DATABASE, 1);
    request.onupgradeneeded = () => request.result.createObjectStore(STORE);
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error ?? new Error('This browser keeps no drafts.'));
  });
}
