import { z } from 'zod';

/** Every error code of the API with its HTTP status and a title; answers are problem+json (RFC 9457). */
export const ERROR_CODES = {
  'bad-request': { status: 400, title: 'The request cannot be read' },
  'not-signed-in': { status: 401, title: 'Not signed in' },
  'wrong-password': { status: 403, title: 'Wrong password' },
  'wrong-origin': { status: 403, title: 'The request comes from another site' },
  forbidden: { status: 403, title: 'Not allowed' },
  'not-found': { status: 404, title: 'Not found' },
  'method-not-allowed': { status: 405, title: 'Not possible here' },
  conflict: { status: 409, title: 'That does not fit what is there' },
  'email-taken': { status: 409, title: 'The address is taken' },
  'programs-blocked': { status: 409, title: 'Errors block the programs' },
  'stale-version': { status: 412, title: 'Somebody saved a newer version' },
  'too-large': { status: 413, title: 'Too large' },
  'wrong-content-type': { status: 415, title: 'Wrong content type' },
  invalid: { status: 422, title: 'Something in it is not right' },
  'version-required': { status: 428, title: 'If-Match is missing' },
  'too-many-requests': { status: 429, title: 'Too many tries' },
  internal: { status: 500, title: 'Something went wrong here' },
  'not-ready': { status: 503, title: 'Not ready' },
  'planning-timeout': { status: 504, title: 'Planning took too long' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ErrorCode = keyof typeof ERROR_CODES;
const errorCode = z.enum(Object.keys(ERROR_CODES) as [ErrorCode, ...ErrorCode[]]);

/** One thing that is wrong with what was sent: its place as a path (`cuts[2].cutter`, `$` for the whole) and a sentence. */
export const problemPlace = z.object({ path: z.string(), message: z.string() });

/** The body of every answer that is an error; `detail` is a plain sentence for people. */
export const problemDetails = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  code: errorCode,
  problems: z.array(problemPlace).optional(),
  /** Seconds to wait, with `too-many-requests`. */
  retryAfter: z.number().optional(),
  /** What is there now, with `stale-version`: a `savedJob` where the job document was to be saved. */
  current: z.unknown().optional(),
});
export type ProblemDetails = z.infer<typeof problemDetails>;

export const PROBLEM_JSON = 'application/problem+json';
