import type { ErrorCode, ProblemDetails } from '@/lib/contracts/problem-details';

/** An answer of the API that says no. `message` is the sentence for people. */
export class ApiError extends Error {
  override readonly name = 'ApiError';

  constructor(readonly details: ProblemDetails) {
    super(details.detail);
  }

  get code(): ErrorCode {
    return this.details.code;
  }

  get status(): number {
    return this.details.status;
  }

  /** What is wrong with one field of what was sent, if that is where the trouble lies. */
  problemAt(path: string): string | undefined {
    return this.details.problems?.find((problem) => problem.path === path)?.message;
  }
}

/** No answer came: the network dropped, or the server is not there. */
export class NoAnswerError extends Error {
  override readonly name = 'NoAnswerError';

  constructor(options?: ErrorOptions) {
    super('The server cannot be reached. Check the connection and try again.', options);
  }
}

/** An answer came that is not what the API promises: a proxy's page, or a server of another version. */
export class UnexpectedAnswerError extends Error {
  override readonly name = 'UnexpectedAnswerError';

  constructor(readonly status: number) {
    super('The server gave an answer that this page does not understand. Reload the page.');
  }
}

/** A sentence for people about anything that a request may throw. */
export function sentenceOf(error: unknown): string {
  if (error instanceof ApiError || error instanceof NoAnswerError || error instanceof UnexpectedAnswerError) {
    return error.message;
  }
  return 'Something went wrong here. Try again; nothing was changed.';
}
