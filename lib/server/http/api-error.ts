import 'server-only';
import {
  ERROR_CODES,
  type ErrorCode,
  PROBLEM_JSON,
  type ProblemDetails,
} from '@/lib/contracts/problem-details';

type Extra = Partial<Pick<ProblemDetails, 'problems' | 'retryAfter' | 'current'>>;

/** A refusal that the caller is told: a code of the table and one plain sentence. */
export class ApiError extends Error {
  override readonly name = 'ApiError';
  constructor(
    readonly code: ErrorCode,
    detail: string,
    readonly extra: Extra = {},
    readonly headers: Readonly<Record<string, string>> = {},
  ) {
    super(detail);
  }
}

/** The same words whether a thing does not exist or is not the caller's. */
export function notFound(what = 'That'): ApiError {
  return new ApiError('not-found', `${what} is not there, or is not shared with you.`);
}

/** The problem+json answer (RFC 9457) to `error`. */
export function problemResponse(error: ApiError): Response {
  const { status, title } = ERROR_CODES[error.code];
  const body: ProblemDetails = {
    type: 'about:blank',
    title,
    status,
    detail: error.message,
    code: error.code,
    ...error.extra,
  };
  const retry = error.extra.retryAfter === undefined ? {} : { 'retry-after': String(error.extra.retryAfter) };
  return new Response(JSON.stringify(body), {
    status,
    headers: { 'content-type': PROBLEM_JSON, 'cache-control': 'no-store', ...retry, ...error.headers },
  });
}
