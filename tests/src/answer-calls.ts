import { afterEach, vi } from 'vitest';

export interface SeenCall {
  readonly method: string;
  readonly path: string;
  readonly body: unknown;
}

/** Puts a server of a few lines in the place of fetch until the test ends. A call that `answer` does not know fails the test by its name. */
export function answerCalls(answer: (call: SeenCall) => Response | undefined): SeenCall[] {
  const seen: SeenCall[] = [];
  vi.stubGlobal('fetch', (path: string, init: RequestInit = {}) => {
    const call = {
      method: init.method ?? 'GET',
      path,
      body: typeof init.body === 'string' ? (JSON.parse(init.body) as unknown) : init.body,
    };
    seen.push(call);
    const response = answer(call);
    return response ? Promise.resolve(response) : Promise.reject(new Error(`nobody answers ${call.method} ${path}`));
  });
  return seen;
}

export const json = (data: unknown, status = 200): Response =>
  new Response(JSON.stringify(data), { status, headers: { 'content-type': 'application/json' } });

afterEach(() => vi.unstubAllGlobals());
