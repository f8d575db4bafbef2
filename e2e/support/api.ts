import type { APIRequestContext } from '@playwright/test';
import type { z } from 'zod';
import { endpointHref, type Endpoint } from '@/lib/contracts/endpoint';
import { baseUrl } from './base-url';

type Values = Readonly<Record<string, string | number>>;

/**
 * Calls an endpoint as whoever is signed in on the request's cookies (`page.request` shares the page's), and reads the
 * answer by its contract. Throws with what the API said when it refuses.
 */
export async function callEndpoint<E extends Endpoint>(
  request: APIRequestContext,
  endpoint: E,
  parts: { readonly params?: Values; readonly body?: z.input<E['body']> } = {},
): Promise<z.output<E['answer']>> {
  const response = await request.fetch(endpointHref(endpoint, parts.params), {
    method: endpoint.method,
    headers: sameOrigin({ 'content-type': 'application/json' }),
    ...(parts.body === undefined ? {} : { data: JSON.stringify(parts.body) }),
  });
  if (response.status() !== endpoint.status) {
    throw new Error(`${endpoint.method} ${endpoint.path}: ${response.status()} ${await response.text()}`);
  }
  const answer: unknown = response.status() === 204 ? undefined : await response.json();
  return endpoint.answer.parse(answer) as z.output<E['answer']>;
}

/** Changes are taken only from the app's own pages; these headers say what a page of it would. */
export function sameOrigin(headers: Readonly<Record<string, string>> = {}): Record<string, string> {
  return { ...headers, origin: new URL(baseUrl()).origin };
}
