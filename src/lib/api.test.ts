import { afterEach, expect, test, vi } from 'vitest';
import { z } from 'zod';
import { noContentSchema, request } from './api';
import { ApiProblem } from './api-problem';

const schema = z.object({ roomCode: z.string() });

function answerWith(status: number, text: string) {
  const fetchSpy = vi.fn(async () => new Response(status === 204 ? null : text, { status }));
  vi.stubGlobal('fetch', fetchSpy);
  return fetchSpy;
}
const catchProblem = (promise: Promise<unknown>) =>
  promise.then(
    () => {
      throw new Error('should have failed');
    },
    (error: unknown) => {
      if (!(error instanceof ApiProblem)) throw error;
      return error;
    },
  );

afterEach(() => vi.unstubAllGlobals());

test('an answer is parsed by its schema and what the contract does not know is dropped', async () => {
  answerWith(200, '{"roomCode":"NR1","secret":1}');
  expect(await request('/api/rooms/1', { schema })).toEqual({ roomCode: 'NR1' });
});

test('an answer that breaks the contract is a problem, not data', async () => {
  answerWith(200, '{"roomCode":7}');
  expect((await catchProblem(request('/api/rooms/1', { schema }))).code).toBe('unexpected-answer');
});

test('a problem keeps all issues by pointer', async () => {
  const issues = [
    { pointer: '/code', detail: 'Fill this in.' },
    { pointer: '/name', detail: 'Fill this in.' },
  ];
  const body = { type: 'about:blank', title: 'T', status: 422, code: 'invalid-input', detail: 'D' };
  answerWith(422, JSON.stringify({ ...body, requestId: null, issues }));
  const problem = await catchProblem(request('/api/rooms', { method: 'POST', body: {}, schema }));
  expect(problem.status).toBe(422);
  expect(problem.issues).toEqual(issues);
});

test('an error page of a proxy is an unexpected answer with its status', async () => {
  answerWith(502, '<html>bad gateway</html>');
  const problem = await catchProblem(request('/api/rooms/1', { schema }));
  expect([problem.code, problem.status]).toEqual(['unexpected-answer', 502]);
});

test('no connection is told as such', async () => {
  vi.stubGlobal('fetch', () => Promise.reject(new TypeError('fetch failed')));
  expect((await catchProblem(request('/api/rooms/1', { schema }))).code).toBe('unreachable');
});

test('an answer without content passes as undefined', async () => {
  answerWith(204, '');
  expect(await request('/api/session', { method: 'DELETE', schema: noContentSchema })).toBeUndefined();
});
