import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { NextRequest } from 'next/server';
import {
  type AnswerOf,
  type BodyOf,
  type Endpoint,
  nothing,
  type ParamsOf,
  type QueryOf,
} from '@/lib/contracts/endpoint';
import { type ProjectAccess, requireProject } from '../access/project-access';
import type { Principal } from '../auth/principal';
import { requestPrincipal } from '../auth/request-principal';
import { entityManager } from '../database';
import { serverEnv } from '../env';
import { ApiError, notFound, problemResponse } from './api-error';
import { checkInput, queryObject } from './check-input';
import { readJsonBody } from './read-body';
import { requireSameOrigin } from './same-origin';

/** What a handler is given: everything checked, and proof of what the caller may do. */
export interface RouteContext<E extends Endpoint> {
  readonly request: Request;
  readonly em: EntityManager;
  readonly params: ParamsOf<E>;
  readonly query: QueryOf<E>;
  readonly body: BodyOf<E>;
  readonly principal: E['access']['kind'] extends 'public' ? Principal | null : Principal;
  readonly project: E['access']['kind'] extends 'project' ? ProjectAccess : null;
}

/** Endpoints without an answer may be handled by what returns nothing. */
type Nothing<E extends Endpoint> = undefined extends AnswerOf<E> ? void : never;

/** Next gives no parameters at all where the address has none. */
type NextContext = { readonly params: Promise<Record<string, string | string[] | undefined> | undefined> };

/** A route handler that knows what it was declared as; a test asks every route file for it. */
export interface RouteHandler {
  (request: NextRequest, context: NextContext): Promise<Response>;
  readonly endpoint: Endpoint;
}

/**
 * Makes a route handler of an endpoint's declaration: origin and content type, who asks, what they may, parameters,
 * query and body are checked before `handle` runs; its answer passes the endpoint's schema, so that nothing leaks; what
 * it throws leaves as problem+json. `handle` gives the answer, or a Response where headers or a stream are wanted.
 */
export function route<E extends Endpoint>(
  endpoint: E,
  handle: (context: RouteContext<E>) => Promise<AnswerOf<E> | Response | Nothing<E>>,
): RouteHandler {
  const handler = async (request: NextRequest, context: NextContext): Promise<Response> => {
    try {
      const answer = await handle(await admit(endpoint, request, (await context.params) ?? {}));
      return answer instanceof Response ? answer : answerResponse(endpoint, answer);
    } catch (error) {
      return problemResponse(asApiError(error, endpoint, request));
    }
  };
  return Object.assign(handler, { endpoint });
}

async function admit<E extends Endpoint>(
  endpoint: E,
  request: Request,
  rawParams: Record<string, unknown>,
): Promise<RouteContext<E>> {
  if (endpoint.method !== 'GET') requireSameOrigin(request.headers, serverEnv().origin);
  const em = await entityManager();
  const principal = await requestPrincipal(em, request.headers);
  if (endpoint.access.kind !== 'public' && !principal) {
    throw new ApiError('not-signed-in', 'Sign in first.');
  }
  const params = checkParams(endpoint, rawParams);
  const project =
    endpoint.access.kind === 'project' && principal
      ? await requireProject(em, principal, projectIdOf(params), endpoint.access.permission)
      : null;
  const query = checkInput(endpoint.query, queryObject(new URL(request.url)));
  const takesBody = endpoint.body !== nothing;
  const body = checkInput(
    endpoint.body,
    takesBody ? await readJsonBody(request, endpoint.bodyLimit) : undefined,
  );
  // What each member is for this endpoint was decided above, by its declaration; the compiler cannot follow that.
  return { request, em, params, query, body, principal, project } as RouteContext<E>;
}

/** An address whose parts are not what they should be leads nowhere. */
function checkParams(endpoint: Endpoint, raw: Record<string, unknown>): unknown {
  const parsed = endpoint.params.safeParse(raw);
  if (!parsed.success) throw notFound();
  return parsed.data;
}

function projectIdOf(params: unknown): string {
  return (params as { projectId: string }).projectId;
}

function answerResponse(endpoint: Endpoint, answer: unknown): Response {
  const headers = { 'cache-control': 'no-store' };
  if (answer === undefined) return new Response(null, { status: endpoint.status, headers });
  return Response.json(endpoint.answer.parse(answer), {
    status: endpoint.status,
    headers: { ...headers, 'content-type': endpoint.mediaType },
  });
}

/** Refusals as they are; anything else is ours, is logged, and its words stay here. */
function asApiError(error: unknown, endpoint: Endpoint, request: Request): ApiError {
  if (error instanceof ApiError) return error;
  if (request.signal.aborted) return new ApiError('bad-request', 'The request was given up.');
  const reference = crypto.randomUUID().slice(0, 8);
  console.error(`${endpoint.method} ${endpoint.path} failed (${reference})`, error);
  return new ApiError('internal', `Something went wrong on the server. Its log has more under ${reference}.`);
}
