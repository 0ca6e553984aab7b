import { afterEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { api, ApiProblem, noContent } from '../../../src/lib/apiClient';
import { makeIdempotencyKey } from '../../../src/lib/idempotencyKey';
import { shouldRetry } from '../../../src/lib/queryClient';

const shape = z.object({ id: z.number() });

function answer(
  status: number,
  body: unknown,
  headers: Record<string, string> = {},
): ReturnType<typeof vi.fn> {
  const text = typeof body === 'string' ? body : JSON.stringify(body);
  const fetchMock = vi.fn(() =>
    Promise.resolve(new Response(status === 204 ? null : text, { status, headers })),
  );
  vi.stubGlobal('fetch', fetchMock);
  return fetchMock;
}

async function problemOf(promise: Promise<unknown>): Promise<ApiProblem> {
  const error: unknown = await promise.then(
    () => null,
    (thrown: unknown) => thrown,
  );
  if (!(error instanceof ApiProblem)) throw new Error('no ApiProblem was thrown');
  return error;
}

afterEach(() => vi.unstubAllGlobals());

describe('a call', () => {
  it('sends JSON with a fresh idempotency key and the version it was made from', async () => {
    const fetchMock = answer(200, { id: 7 });
    await api.send('PATCH', '/slings/7', { notes: 'x' }, shape, { ifMatch: 3 });
    await api.send('PATCH', '/slings/7', { notes: 'x' }, shape);
    const [first, second] = fetchMock.mock.calls.map((call) => new Headers((call[1] as RequestInit).headers));
    expect(fetchMock.mock.calls[0]?.[0]).toBe('/api/slings/7');
    expect(first?.get('If-Match')).toBe('"3"');
    expect(second?.get('If-Match')).toBeNull();
    expect(first?.get('Idempotency-Key')).toMatch(/^[0-9a-f-]{36}$/);
    expect(first?.get('Idempotency-Key')).not.toBe(second?.get('Idempotency-Key'));
  });

  it('repeats a given idempotency key', async () => {
    const fetchMock = answer(200, { id: 7 });
    await api.send('POST', '/slings', {}, shape, { idempotencyKey: 'same' });
    expect(new Headers((fetchMock.mock.calls[0]?.[1] as RequestInit).headers).get('Idempotency-Key')).toBe(
      'same',
    );
  });

  it('takes an answer without content', async () => {
    answer(204, null);
    await expect(api.send('DELETE', '/session', undefined, noContent)).resolves.toBeUndefined();
  });

  it('turns a refusal into its words and what is unmet', async () => {
    answer(
      422,
      {
        type: 'x/unmet',
        title: 'Not yet',
        status: 422,
        detail: 'Still asked for',
        unmet: [{ rule: 'label', message: 'A live label.' }],
      },
      { 'Retry-After': '30' },
    );
    const problem = await problemOf(api.get('/slings/7', shape));
    expect(problem).toMatchObject({ kind: 'refused', status: 422, title: 'Not yet', retryAfterSeconds: 30 });
    expect(problem.unmet).toEqual([{ rule: 'label', message: 'A live label.' }]);
  });

  it('finds the message for a field', async () => {
    answer(400, {
      type: 'x',
      title: 'Look again',
      status: 400,
      detail: '',
      errors: [{ path: 'ratedLoads.verticalKg', message: 'More than zero.' }],
    });
    expect((await problemOf(api.get('/x', shape))).errorFor('ratedLoads.verticalKg')).toBe('More than zero.');
  });

  it('has words for a proxy’s page', async () => {
    answer(503, '<html>Bad gateway</html>');
    const problem = await problemOf(api.get('/x', shape));
    expect(problem.title).toBe('The store is not answering');
    expect(problem.detail).not.toContain('<html>');
  });

  it('has words for no network', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    expect(await problemOf(api.get('/x', shape))).toMatchObject({
      kind: 'offline',
      status: 0,
      title: 'No connection',
    });
  });

  it('refuses an answer of another shape', async () => {
    answer(200, { id: 'seven' });
    expect((await problemOf(api.get('/x', shape))).kind).toBe('broken');
  });
});

describe('asking again', () => {
  it('never repeats a refusal, and repeats silence and server faults twice', () => {
    expect(shouldRetry(0, new ApiProblem('refused', 409, {}))).toBe(false);
    expect(shouldRetry(0, new ApiProblem('refused', 401, {}))).toBe(false);
    expect(shouldRetry(0, new ApiProblem('broken', 200, {}))).toBe(false);
    expect(shouldRetry(1, new ApiProblem('refused', 503, {}))).toBe(true);
    expect(shouldRetry(1, new ApiProblem('offline', 0, {}))).toBe(true);
    expect(shouldRetry(2, new ApiProblem('offline', 0, {}))).toBe(false);
  });
});

it('makes idempotency keys where the page is not served over HTTPS', () => {
  vi.stubGlobal('crypto', { getRandomValues: (bytes: Uint8Array) => bytes.fill(0xab) });
  expect(makeIdempotencyKey()).toBe('abababab-abab-abab-abab-abababababab');
});
