import type { z } from 'zod';
import { ApiError } from './api-error.ts';
import { decodeError } from './decode-error.ts';

interface FileUpload<Answer> {
  /** Begins with /api/. */
  readonly path: string;
  /** Form field that the file goes in. */
  readonly field: string;
  readonly file: File;
  readonly answer: z.ZodType<Answer>;
  readonly signal: AbortSignal;
  /** Share that has been sent, from 0 to 1. */
  readonly onSent: (done: number) => void;
}

/** What came back, as fetch would give it; a status of 0 never comes here. */
const responseOf = (call: XMLHttpRequest): Response => new Response(call.responseText, { status: call.status });

/**
 * Posts a file and says how much of it has gone, which fetch does not. Answers what the schema reads; throws ApiError for
 * all else, and an AbortError when cancelled.
 */
export async function uploadFile<Answer>({ path, field, file, answer, signal, onSent }: FileUpload<Answer>) {
  const body = new FormData();
  body.append(field, file, file.name);
  const call = new XMLHttpRequest();
  await new Promise<void>((resolve, reject) => {
    const stop = () => call.abort();
    call.open('POST', path);
    call.setRequestHeader('accept', 'application/json');
    call.upload.addEventListener('progress', ({ loaded, total }) => onSent(total > 0 ? loaded / total : 0));
    call.addEventListener('load', () => resolve());
    call.addEventListener('error', () => reject(new ApiError(0, 'unreachable', `${path} did not answer`)));
    call.addEventListener('abort', () => reject(new DOMException('The upload was cancelled.', 'AbortError')));
    call.addEventListener('loadend', () => signal.removeEventListener('abort', stop));
    signal.addEventListener('abort', stop);
    call.send(body);
    if (signal.aborted) stop();
  });
  const response = responseOf(call);
  if (!response.ok) throw await decodeError(response);
  const read = answer.safeParse(await response.json().catch(() => undefined));
  if (!read.success)
    throw new ApiError(response.status, 'unexpected-answer', `${path} answered what no contract knows`);
  return read.data;
}
