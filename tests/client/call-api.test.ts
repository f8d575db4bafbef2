import { afterEach, describe, expect, it, vi } from 'vitest';
import { ApiError, NoAnswerError, sentenceOf, UnexpectedAnswerError } from '@/lib/client/api-error';
import { callApi } from '@/lib/client/call-api';
import { ENDPOINTS } from '@/lib/contracts/endpoints';

const projectId = '7b0f3b1e-6f0a-4a57-9d4e-1d1b0c3f5a10';

function answer(status: number, body: unknown, type = 'application/json') {
  const fetching = vi.fn<typeof fetch>(async () =>
    body === undefined
      ? new Response(null, { status })
      : new Response(typeof body === 'string' ? body : JSON.stringify(body), {
          status,
          headers: { 'content-type': type },
        }),
  );
  vi.stubGlobal('fetch', fetching);
  return fetching;
}

afterEach(() => vi.unstubAllGlobals());

describe('callApi', () => {
  it('fills the address, and sends changes as JSON even without a body', async () => {
    const fetching = answer(204, undefined);
    await expect(callApi(ENDPOINTS.deleteProject, { params: { projectId } })).resolves.toBeUndefined();
    const [href, init] = fetching.mock.calls[0] ?? [];
    expect(href).toBe(`/api/projects/${projectId}`);
    expect(init).toMatchObject({ method: 'DELETE', headers: { 'content-type': 'application/json' } });
    expect(init).not.toHaveProperty('body');
  });

  it('writes the query and leaves out what is undefined', async () => {
    const fetching = answer(200, { items: [], nextCursor: null });
    await callApi(ENDPOINTS.listProjects, { query: { search: 'oak & ash', state: undefined } });
    expect(fetching.mock.calls[0]?.[0]).toBe('/api/projects?search=oak%20%26%20ash');
  });

  it('throws the sentence of problem+json, with the fields it names', async () => {
    answer(
      422,
      {
        type: 'about:blank',
        title: 'Something in it is not right',
        status: 422,
        detail: 'The name is empty.',
        code: 'invalid',
        problems: [{ path: 'name', message: 'must not be empty' }],
      },
      'application/problem+json; charset=utf-8',
    );
    const error: unknown = await callApi(ENDPOINTS.changeAccount, { body: { name: '' } }).catch(
      (e: unknown) => e,
    );
    expect(error).toBeInstanceOf(ApiError);
    expect(sentenceOf(error)).toBe('The name is empty.');
    expect((error as ApiError).problemAt('name')).toBe('must not be empty');
    expect((error as ApiError).problemAt('email')).toBeUndefined();
  });

  it.each([
    ['a page instead of JSON', 200, '<html></html>', 'text/html'],
    ['JSON of another shape', 200, { items: 'none' }, 'application/json'],
    ['an error that is no problem+json', 502, 'Bad gateway', 'text/plain'],
    ['problem+json with an unknown code', 400, { code: 'moon' }, 'application/problem+json'],
  ])('does not take %s for an answer', async (_, status, body, type) => {
    answer(status, body, type);
    const error: unknown = await callApi(ENDPOINTS.listProjects, {}).catch((e: unknown) => e);
    expect(error).toBeInstanceOf(UnexpectedAnswerError);
    expect((error as UnexpectedAnswerError).status).toBe(status);
  });

  it('says that nobody answered, but lets a called-off request be called off', async () => {
    vi.stubGlobal(
      'fetch',
      vi.fn<typeof fetch>(() => Promise.reject(new TypeError('failed to fetch'))),
    );
    await expect(callApi(ENDPOINTS.me, {})).rejects.toBeInstanceOf(NoAnswerError);
    const calledOff = AbortSignal.abort(new DOMException('called off', 'AbortError'));
    await expect(callApi(ENDPOINTS.me, {}, { signal: calledOff })).rejects.toHaveProperty(
      'name',
      'AbortError',
    );
  });
});

it('never shows what an unknown error says', () => {
  expect(sentenceOf(new Error('secret of the machine'))).not.toContain('secret');
});
