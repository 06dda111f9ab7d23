import { afterEach, vi } from 'vitest';

/** One upload that a page has begun; the test says what becomes of it. */
export class FakeUpload extends EventTarget {
  readonly upload = new EventTarget();
  status = 0;
  responseText = '';
  path = '';
  sent: File | null = null;
  aborted = false;

  open(_method: string, path: string): void {
    this.path = path;
  }
  setRequestHeader(): void {}
  send(body: FormData): void {
    this.sent = body.get('file') as File;
  }
  abort(): void {
    this.aborted = true;
    this.dispatchEvent(new Event('abort'));
    this.dispatchEvent(new Event('loadend'));
  }

  progress(loaded: number, total: number): void {
    this.upload.dispatchEvent(Object.assign(new Event('progress'), { loaded, total }));
  }
  answer(status: number, data: unknown): void {
    this.status = status;
    this.responseText = typeof data === 'string' ? data : JSON.stringify(data);
    this.dispatchEvent(new Event('load'));
    this.dispatchEvent(new Event('loadend'));
  }
  fail(): void {
    this.dispatchEvent(new Event('error'));
    this.dispatchEvent(new Event('loadend'));
  }
}

/** Puts itself in the place of the browser's uploads until the test ends; answers those that were begun. */
export function takeUploads(): FakeUpload[] {
  const begun: FakeUpload[] = [];
  vi.stubGlobal(
    'XMLHttpRequest',
    class extends FakeUpload {
      constructor() {
        super();
        begun.push(this);
      }
    },
  );
  return begun;
}

afterEach(() => vi.unstubAllGlobals());
