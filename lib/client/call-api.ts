import type { z } from 'zod';
import { PROBLEM_JSON, problemDetails } from '@/lib/contracts/problem-details';
import { ApiError, NoAnswerError, UnexpectedAnswerError } from './api-error';

export interface ApiCall {
  readonly method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** Sent as JSON. */
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
  readonly signal?: AbortSignal;
  /** Lets the request outlive the page, for what is saved at the last moment. */
  readonly keepalive?: boolean;
}

/**
 * Asks the API and reads the answer by its schema.
 * Throws ApiError (the API said no), NoAnswerError (nobody answered), UnexpectedAnswerError (not what was promised),
 * or the signal's reason when it was called off.
 */
export async function callApi<Schema extends z.ZodType>(
  path: string,
  schema: Schema,
  call: ApiCall = {},
): Promise<z.infer<Schema>> {
  const response = await requestApi(path, call);
  const parsed = schema.safeParse(await readJson(response));
  if (!parsed.success) throw new UnexpectedAnswerError(response.status);
  return parsed.data;
}

/** Like `callApi`, for answers without a body and for those whose headers count. */
export async function requestApi(path: string, call: ApiCall = {}): Promise<Response> {
  const response = await send(path, call);
  if (response.ok) return response;
  throw await errorOf(response);
}

async function send(
  path: string,
  { method = 'GET', body, headers, signal, keepalive }: ApiCall,
): Promise<Response> {
  try {
    return await fetch(path, {
      method,
      headers: {
        accept: `application/json, ${PROBLEM_JSON}`,
        // State-changing routes insist on it, with or without a body.
        ...(method === 'GET' ? {} : { 'content-type': 'application/json' }),
        ...headers,
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      ...(signal ? { signal } : {}),
      ...(keepalive ? { keepalive } : {}),
    });
  } catch (cause) {
    if (signal?.aborted) throw signal.reason;
    throw new NoAnswerError({ cause });
  }
}

async function errorOf(response: Response): Promise<Error> {
  if (!response.headers.get('content-type')?.startsWith(PROBLEM_JSON))
    return new UnexpectedAnswerError(response.status);
  const parsed = problemDetails.safeParse(await readJson(response));
  return parsed.success ? new ApiError(parsed.data) : new UnexpectedAnswerError(response.status);
}

async function readJson(response: Response): Promise<unknown> {
  try {
    return await response.json();
  } catch {
    return undefined;
  }
}
