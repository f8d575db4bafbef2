import { z } from 'zod';
import type { ProjectPermission, ShopPermission } from './roles';

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/**
 * Who may call an endpoint. `project`: whoever's role in `{projectId}` has the permission; to others the project is not
 * there. `shop`: the same for the shop that the request is about.
 */
export type Access =
  | { readonly kind: 'public' }
  | { readonly kind: 'signed-in' }
  | { readonly kind: 'project'; readonly permission: ProjectPermission }
  | { readonly kind: 'shop'; readonly permission: ShopPermission };

/** One method of one address: who may call it, what it takes and what it answers. */
export interface Endpoint<
  Params extends z.ZodType = z.ZodType,
  Query extends z.ZodType = z.ZodType,
  Body extends z.ZodType = z.ZodType,
  Answer extends z.ZodType = z.ZodType,
  Who extends Access = Access,
> {
  readonly method: Method;
  /** With its parameters in braces: `/api/projects/{projectId}`. */
  readonly path: `/api/${string}`;
  readonly access: Who;
  readonly summary: string;
  readonly params: Params;
  readonly query: Query;
  /** `nothing` where the request has no body. */
  readonly body: Body;
  readonly answer: Answer;
  readonly status: number;
  readonly mediaType: string;
  /** Greatest body in bytes. */
  readonly bodyLimit: number;
}

export type ParamsOf<E> = E extends Endpoint<infer P> ? z.output<P> : never;
export type QueryOf<E> = E extends Endpoint<z.ZodType, infer Q> ? z.output<Q> : never;
export type BodyOf<E> = E extends Endpoint<z.ZodType, z.ZodType, infer B> ? z.output<B> : never;
export type AnswerOf<E> = E extends Endpoint<z.ZodType, z.ZodType, z.ZodType, infer A> ? z.output<A> : never;

/** No parameters, no query. */
export const none = z.strictObject({});
/** No body. */
export const nothing = z.undefined();
/** Anything JSON can hold; what reads it checks it. */
export const anyJson = z.unknown();

const KILOBYTE = 1024;

/** Fills in what most endpoints share: no parameters, no query, no body, a JSON answer with status 200. */
export function endpoint<
  Params extends z.ZodType = typeof none,
  Query extends z.ZodType = typeof none,
  Body extends z.ZodType = typeof nothing,
  Answer extends z.ZodType = typeof nothing,
  Who extends Access = Access,
>(
  method: Method,
  path: `/api/${string}`,
  access: Who,
  rest: {
    readonly summary: string;
    readonly params?: Params;
    readonly query?: Query;
    readonly body?: Body;
    readonly answer?: Answer;
    readonly status?: number;
    readonly mediaType?: string;
    readonly bodyLimit?: number;
  },
): Endpoint<Params, Query, Body, Answer, Who> {
  return {
    method,
    path,
    access,
    summary: rest.summary,
    // The defaults are the type parameters' own defaults, which the compiler cannot see.
    params: rest.params ?? (none as unknown as Params),
    query: rest.query ?? (none as unknown as Query),
    body: rest.body ?? (nothing as unknown as Body),
    answer: rest.answer ?? (nothing as unknown as Answer),
    status: rest.status ?? (rest.answer || rest.mediaType ? 200 : 204),
    mediaType: rest.mediaType ?? 'application/json',
    bodyLimit: rest.bodyLimit ?? 64 * KILOBYTE,
  };
}

/** The address of an endpoint with its parameters and query filled in; query values left undefined are left out. */
export function endpointHref(
  { path }: Pick<Endpoint, 'path'>,
  params: Readonly<Record<string, string | number>> = {},
  query: Readonly<Record<string, string | number | undefined>> = {},
): string {
  const filled = path.replace(/\{(\w+)\}/g, (_, name: string) => {
    const value = params[name];
    if (value === undefined) throw new Error(`${path} needs ${name}`);
    return encodeURIComponent(String(value));
  });
  const pairs = Object.entries(query).filter(([, value]) => value !== undefined);
  const text = pairs.map(([key, value]) => `${key}=${encodeURIComponent(String(value))}`).join('&');
  return text ? `${filled}?${text}` : filled;
}
