import { ApiError } from './api-error.ts';
import { decodeError } from './decode-error.ts';

interface DownloadCall {
  /** Begins with /api/. */
  readonly path: string;
  readonly signal: AbortSignal;
  /** Bytes so far. */
  readonly onBytes?: (received: number) => void;
}

/** File name as the server gives it (RFC 6266: filename* before filename). */
export function nameFromDisposition(header: string | null): string | undefined {
  const extended = /filename\*\s*=\s*UTF-8''([^;]+)/i.exec(header ?? '')?.[1];
  if (extended !== undefined) return decodeURIComponent(extended.trim());
  return /filename\s*=\s*"?([^";]+)"?/i.exec(header ?? '')?.[1]?.trim();
}

function save(blob: Blob, name: string): void {
  const address = URL.createObjectURL(blob);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // The browser has taken the blob over once the click is handled; a minute is long enough even for a slow one.
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}

/**
 * Fetches a file and hands it to the browser to save, so that a refusal can be read as an ApiError
 * in place of being saved as a file. Throws the abort when cancelled.
 */
export async function downloadFile({ path, signal, onBytes }: DownloadCall): Promise<{ name: string; bytes: number }> {
  let response: Response;
  try {
    response = await fetch(path, { signal, credentials: 'same-origin' });
  } catch (error) {
    if (signal.aborted) throw error;
    throw new ApiError(0, 'unreachable', error instanceof Error ? error.message : String(error));
  }
  if (!response.ok) throw await decodeError(response);
  const name = nameFromDisposition(response.headers.get('content-disposition'));
  if (name === undefined || response.body === null)
    throw new ApiError(response.status, 'unexpected-answer', `${path} answered no file`);
  const parts: Uint8Array<ArrayBuffer>[] = [];
  let bytes = 0;
  for (const reader = response.body.getReader(); ;) {
    const { done, value } = await reader.read();
    if (done) break;
    parts.push(value);
    bytes += value.length;
    onBytes?.(bytes);
  }
  save(new Blob(parts, { type: response.headers.get('content-type') ?? '' }), name);
  return { name, bytes };
}
