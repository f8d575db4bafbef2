import { randomUUID } from 'node:crypto';
import type { APIRequestContext } from '@playwright/test';
import { z } from 'zod';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { callEndpoint, sameOrigin } from './api';

export interface Account {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

/** Makes an account that no other test has, with a shop of its own. It is not signed in yet. */
export async function signUp(request: APIRequestContext, name: string): Promise<Account> {
  const mark = randomUUID();
  const fields = { name, email: `${mark}@e2e.test`, password: `a long enough one ${mark}` };
  const { id } = await callEndpoint(request, ENDPOINTS.signUp, { body: fields });
  return { id, ...fields };
}

/** Signs in the way the sign-in form does; the session cookie stays with the request context, and so with its page. */
export async function signIn(request: APIRequestContext, account: Account): Promise<void> {
  const csrf = z.object({ csrfToken: z.string() });
  const { csrfToken } = csrf.parse(await (await request.get('/api/auth/csrf')).json());
  const response = await request.post('/api/auth/callback/credentials', {
    headers: sameOrigin(),
    form: { csrfToken, email: account.email, password: account.password, json: 'true' },
  });
  const answer = await response.text();
  if (!response.ok()) throw new Error(`Sign-in of ${account.email}: ${response.status()} ${answer}`);
  await callEndpoint(request, ENDPOINTS.me);
}
