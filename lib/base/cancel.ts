/** Thrown by long work when its `isCancelled` answered true; callers turn it into their own quiet end. */
export class CancelledError extends Error {
  override readonly name = 'CancelledError';
  constructor() {
    super('The work was cancelled.');
  }
}

/** How long work tells where it is and learns that nobody wants its result any more. */
export interface WorkControl {
  /** Called with the share done, 0 to 1, and a few words on what is being done. */
  readonly onProgress?: (share: number, what: string) => void;
  /** Polled often; answer true and the work throws {@link CancelledError} soon after. */
  readonly isCancelled?: () => boolean;
}

/** Throws {@link CancelledError} when the caller gave up. Cheap enough for every pass of an outer loop. */
export function checkCancelled(control: WorkControl | undefined): void {
  if (control?.isCancelled?.()) throw new CancelledError();
}
