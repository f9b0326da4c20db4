import { z } from 'zod';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { call, get, onSignedOut, request } from '../../src/api/http.ts';
import { ProblemError } from '../../src/api/problem.ts';

const answer = (status: number, body?: unknown, type = 'application/json') =>
  new Response(body === undefined ? null : JSON.stringify(body), {
    status,
    headers: { 'content-type': type },
  });
const unauthenticated = () =>
  answer(
    401,
    { type: 'about:blank', title: 'Sign in', status: 401, code: 'unauthenticated' },
    'application/problem+json',
  );

const fetched = vi.fn<typeof fetch>();
const paths = () => fetched.mock.calls.map(([address]) => String(address));
const optionsOf = (place: number) => fetched.mock.calls[place]?.[1];
const schema = z.object({ name: z.string() });

beforeEach(() => {
  fetched.mockReset();
  vi.stubGlobal('fetch', fetched);
  onSignedOut(() => undefined);
});

describe('a request', () => {
  it('reads the answer by its contract', async () => {
    fetched.mockResolvedValueOnce(answer(200, { name: 'GP-01', secret: 1 }));
    expect(await get(schema, '/api/families', { query: { before: 7, none: undefined } })).toEqual({
      name: 'GP-01',
    });
    expect(paths()).toEqual(['/api/families?before=7']);
  });

  it('says so when the answer is not as agreed', async () => {
    fetched.mockResolvedValueOnce(answer(200, { name: 3 }));
    await expect(get(schema, '/api/families')).rejects.toMatchObject({
      problem: { code: 'unexpected-answer' },
    });
  });

  it('sends the lock version that was read as If-Match', async () => {
    fetched.mockResolvedValueOnce(answer(200, { name: 'x' }));
    await request(schema, 'PUT', '/api/settings', { body: { firm: 'x' }, lockVersion: 4 });
    expect(optionsOf(0)?.headers).toMatchObject({ 'if-match': '"4"', 'content-type': 'application/json' });
    expect(optionsOf(0)?.body).toBe('{"firm":"x"}');
  });

  it('hands on every fault of a problem, with the request id', async () => {
    const errors = [
      { field: 'definition.parameters.pitch.to', message: 'Pitch must not be below 10 mm.' },
      { field: 'code', message: 'GP-01 is taken.' },
    ];
    const body = { type: 'x', title: 'Faults', status: 422, code: 'validation', requestId: 'r-1', errors };
    fetched.mockResolvedValueOnce(answer(422, body, 'application/problem+json'));
    const fault = await call('POST', '/api/families', { body: {} }).catch((error: unknown) => error);
    expect(fault).toBeInstanceOf(ProblemError);
    expect((fault as ProblemError).faults).toEqual(errors);
    expect((fault as ProblemError).problem.requestId).toBe('r-1');
  });

  it('says in words that the server cannot be reached', async () => {
    fetched.mockRejectedValueOnce(new TypeError('Failed to fetch'));
    await expect(call('GET', '/api/families')).rejects.toMatchObject({ problem: { code: 'unreachable' } });
  });

  it('passes an abort on as it is', async () => {
    fetched.mockRejectedValueOnce(new DOMException('gone', 'AbortError'));
    await expect(call('GET', '/api/families')).rejects.toMatchObject({ name: 'AbortError' });
  });
});

describe('a session that has run out', () => {
  it('is renewed once for all who wait, and each request is sent again', async () => {
    let renewed = false;
    fetched.mockImplementation((address) => {
      if (address === '/api/auth/refresh') {
        renewed = true;
        return Promise.resolve(answer(204));
      }
      return Promise.resolve(renewed ? answer(200, { name: 'there' }) : unauthenticated());
    });
    const both = await Promise.all([get(schema, '/api/a'), get(schema, '/api/b')]);
    expect(both).toEqual([{ name: 'there' }, { name: 'there' }]);
    expect(paths().filter((path) => path === '/api/auth/refresh')).toHaveLength(1);
  });

  it('is told to the program when it cannot be renewed', async () => {
    const told = vi.fn();
    onSignedOut(told);
    fetched.mockImplementation(() => Promise.resolve(unauthenticated()));
    await expect(call('GET', '/api/families')).rejects.toMatchObject({ problem: { status: 401 } });
    expect(told).toHaveBeenCalledOnce();
    expect(paths()).toEqual(['/api/families', '/api/auth/refresh']);
  });

  it('is not looked for when signing in is refused', async () => {
    fetched.mockImplementation(() => Promise.resolve(unauthenticated()));
    await expect(call('POST', '/api/auth/sign-in', { body: {} })).rejects.toMatchObject({
      problem: { status: 401 },
    });
    expect(paths()).toEqual(['/api/auth/sign-in']);
  });
});
