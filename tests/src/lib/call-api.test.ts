// @vitest-environment node
import { describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { ApiError } from '../../../src/lib/api-error.ts';
import { callApi } from '../../../src/lib/call-api.ts';
import { answerCalls, json } from '../answer-calls.ts';

const failure = (call: Promise<unknown>): Promise<ApiError> =>
  call.then(
    () => Promise.reject(new Error('the call did not fail')),
    (error: unknown) =>
      error instanceof ApiError ? error : Promise.reject(new Error(`not an ApiError: ${String(error)}`)),
  );

describe('callApi', () => {
  it('When the answer fits its schema, then it comes back as read', async () => {
    answerCalls(() => json({ id: 'a', more: 1 }));
    expect(await callApi({ path: '/api/thing', answer: z.object({ id: z.string() }) })).toEqual({ id: 'a' });
  });

  it('When the answer does not fit, then the error names the path and the entry', async () => {
    answerCalls(() => json({ id: 7 }));
    const error = await failure(callApi({ path: '/api/thing', answer: z.object({ id: z.string() }) }));
    expect(error.code).toBe('unexpected-answer');
    expect(error.message).toContain('/api/thing');
    expect(error.message).toContain('id');
  });

  it('When the server refuses, then code, fields and details are decoded', async () => {
    const fields = [
      { path: 'name', message: 'name: got nothing, takes some text', got: 'nothing', takes: 'some text' },
    ];
    answerCalls(() => json({ code: 'invalid-input', message: '1 entry to mend', fields, details: { a: 1 } }, 422));
    const error = await failure(callApi({ method: 'POST', path: '/api/jobs', body: {} }));
    expect(error).toMatchObject({ status: 422, code: 'invalid-input', fields, details: { a: 1 } });
  });

  it('When the refusal has a code that is not known, or is no JSON, then that is said', async () => {
    answerCalls(() => json({ code: 'teapot', message: 'short and stout' }, 418));
    expect((await failure(callApi({ path: '/api/jobs' }))).code).toBe('unexpected-answer');
    answerCalls(() => new Response('<h1>Bad gateway</h1>', { status: 502 }));
    expect(await failure(callApi({ path: '/api/jobs' }))).toMatchObject({ status: 502, code: 'unexpected-answer' });
  });

  it('When there is no server, then the error is "unreachable"; when the caller aborts, then it is the abort', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    expect((await failure(callApi({ path: '/api/jobs' }))).code).toBe('unreachable');
    vi.stubGlobal('fetch', () => Promise.reject(new DOMException('Aborted', 'AbortError')));
    await expect(callApi({ path: '/api/jobs' })).rejects.toThrow(DOMException);
  });

  it('When a form is sent, then it goes as it is and not as JSON', async () => {
    const seen = answerCalls(() => json({}));
    const body = new FormData();
    await callApi({ method: 'POST', path: '/api/files', body, answer: z.object({}) });
    expect(seen[0]?.body).toBe(body);
  });
});
