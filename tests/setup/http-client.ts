/** An answer, read whole. */
export interface Answer {
  readonly status: number;
  readonly headers: Headers;
  readonly bytes: Uint8Array;
  /** The JSON body; throws where there is none. */
  json<T = Record<string, unknown>>(): T;
}

interface Sent {
  /** JSON, form data, or text as it is. */
  readonly body?: unknown;
  readonly headers?: Record<string, string>;
}

/** A visitor: keeps cookies, and sends what browsers send. */
export class HttpClient {
  readonly url: string;
  #cookie = '';

  constructor(url: string) {
    this.url = url;
  }

  get cookie(): string {
    return this.#cookie;
  }

  /** Comes back with a cookie kept from before. */
  useCookie(cookie: string): void {
    this.#cookie = cookie;
  }

  async send(method: string, path: string, { body, headers = {} }: Sent = {}): Promise<Answer> {
    const raw = body === undefined || typeof body === 'string' || body instanceof FormData;
    const answer = await fetch(`${this.url}${path}`, {
      method,
      redirect: 'manual',
      headers: {
        ...(body !== undefined && !(body instanceof FormData) ? { 'Content-Type': 'application/json' } : {}),
        ...(this.#cookie ? { Cookie: this.#cookie } : {}),
        ...headers,
      },
      body: raw ? body : JSON.stringify(body),
    });
    for (const line of answer.headers.getSetCookie()) {
      const [pair = ''] = line.split(';');
      this.#cookie = pair.endsWith('=') ? '' : pair;
    }
    const bytes = new Uint8Array(await answer.arrayBuffer());
    return {
      status: answer.status,
      headers: answer.headers,
      bytes,
      json: <T>() => JSON.parse(new TextDecoder().decode(bytes)) as T,
    };
  }

  get = (path: string, headers?: Record<string, string>): Promise<Answer> =>
    this.send('GET', path, headers ? { headers } : {});
  post = (path: string, body?: unknown): Promise<Answer> => this.send('POST', path, { body });
  put = (path: string, body?: unknown): Promise<Answer> => this.send('PUT', path, { body });
  patch = (path: string, body?: unknown): Promise<Answer> => this.send('PATCH', path, { body });
  delete = (path: string): Promise<Answer> => this.send('DELETE', path);
}
