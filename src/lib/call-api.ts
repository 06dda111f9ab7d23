import type { z } from 'zod';
import { ApiError } from './api-error.ts';
import { decodeError } from './decode-error.ts';

interface ApiCall<Answer> {
  readonly method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** Begins with /api/. */
  readonly path: string;
  /** Sent as JSON; FormData goes as it is. */
  readonly body?: unknown;
  /** Schema of the answer; left out for calls that answer nothing (204). */
  readonly answer?: z.ZodType<Answer>;
  readonly signal?: AbortSignal;
  /** Lets the call outlive the page, for a last save. */
  readonly keepalive?: boolean;
}

async function send({ method = 'GET', path, body, signal, keepalive }: ApiCall<unknown>): Promise<Response> {
  const isForm = body instanceof FormData;
  try {
    return await fetch(path, {
      method,
      signal,
      keepalive,
      credentials: 'same-origin',
      headers: {
        accept: 'application/json',
        ...(body !== undefined && !isForm ? { 'content-type': 'application/json' } : {}),
      },
      body: body === undefined ? undefined : isForm ? body : JSON.stringify(body),
    });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw new ApiError(0, 'unreachable', error instanceof Error ? error.message : String(error));
  }
}

/** The only way to the server. Answers what the schema reads; throws ApiError for all else but an abort. */
export async function callApi<Answer = void>(call: ApiCall<Answer>): Promise<Answer> {
  const response = await send(call);
  if (!response.ok) throw await decodeError(response);
  if (call.answer === undefined) return undefined as Answer;
  let data: unknown;
  try {
    data = await response.json();
  } catch (error) {
    throw new ApiError(response.status, 'unexpected-answer', `${call.path} did not answer JSON: ${String(error)}`);
  }
  const read = call.answer.safeParse(data);
  if (!read.success) {
    const where = read.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join('; ');
    throw new ApiError(response.status, 'unexpected-answer', `${call.path} answered what no contract knows: ${where}`);
  }
  return read.data;
}
