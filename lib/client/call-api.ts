import type { z } from 'zod';
import { endpointHref, type Endpoint } from '@/lib/contracts/endpoint';
import { PROBLEM_JSON, problemDetails } from '@/lib/contracts/problem-details';
import { ApiError, NoAnswerError, UnexpectedAnswerError } from './api-error';

/** One part of a request, left out where the endpoint takes none of it or all of it is optional. */
type Part<Name extends string, Value> =
  Record<never, never> extends Value
    ? { readonly [K in Name]?: Value }
    : [undefined] extends [Value]
      ? { readonly [K in Name]?: undefined }
      : { readonly [K in Name]: Value };

/** What an endpoint takes, by its contract. */
export type RequestOf<E extends Endpoint> = Part<'params', z.input<E['params']>> &
  Part<'query', z.input<E['query']>> &
  Part<'body', z.input<E['body']>>;

export interface CallOptions {
  readonly signal?: AbortSignal;
  readonly headers?: Readonly<Record<string, string>>;
  /** Lets the request outlive the page, for what is sent at the last moment. */
  readonly keepalive?: boolean;
}

/**
 * Calls an endpoint of the API and reads the answer by its contract:
 * `await callApi(ENDPOINTS.changeProject, { params: { projectId }, body: { name } })`.
 * Throws ApiError (the API said no), NoAnswerError (nobody answered), UnexpectedAnswerError (not what was promised),
 * or the signal's reason when it was called off.
 */
export async function callApi<E extends Endpoint>(
  endpoint: E,
  request: RequestOf<E>,
  options: CallOptions = {},
): Promise<z.output<E['answer']>> {
  const response = await requestApi(endpoint, request, options);
  const answer = response.status === 204 ? undefined : await readJson(response);
  const parsed = endpoint.answer.safeParse(answer);
  if (!parsed.success) throw new UnexpectedAnswerError(response.status);
  return parsed.data as z.output<E['answer']>;
}

/** Like `callApi`, for answers that are not JSON and for those whose headers count. */
export async function requestApi<E extends Endpoint>(
  endpoint: E,
  request: RequestOf<E>,
  options: CallOptions = {},
): Promise<Response> {
  const { params, query, body } = request as { params?: Values; query?: Values; body?: unknown };
  const response = await send(endpointHref(endpoint, params, query), endpoint.method, body, options);
  if (response.ok) return response;
  throw await errorOf(response);
}

type Values = Readonly<Record<string, string | number>>;

async function send(href: string, method: string, body: unknown, options: CallOptions): Promise<Response> {
  const { signal, headers, keepalive } = options;
  try {
    return await fetch(href, {
      method,
      headers: {
        accept: `application/json, ${PROBLEM_JSON}`,
        // Routes that change something insist on it, with or without a body.
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
  const isProblem = response.headers.get('content-type')?.startsWith(PROBLEM_JSON);
  const parsed = isProblem ? problemDetails.safeParse(await readJson(response)) : undefined;
  return parsed?.success ? new ApiError(parsed.data) : new UnexpectedAnswerError(response.status);
}

async function readJson(response: Response): Promise<unknown> {
  try {
    return await response.json();
  } catch {
    return undefined;
  }
}
