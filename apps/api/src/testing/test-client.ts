import { guardHeader } from '#shared/contracts/headers.ts';

export type Answer = {
  readonly status: number;
  readonly headers: Headers;
  /** Read as JSON where it says it is, else the text. */
  readonly body: unknown;
  readonly text: string;
};

type Options = {
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
};

/**
 * A browser as far as the API can tell: keeps cookies, says where its page is from and that its
 * own script asks. Redirects are answers, not followed.
 */
export class TestClient {
  readonly #url: string;
  readonly #cookies = new Map<string, string>();

  constructor(url: string) {
    this.#url = url;
  }

  get(path: string, options: Options = {}): Promise<Answer> {
    return this.send('GET', path, options);
  }

  post(path: string, body?: unknown, options: Options = {}): Promise<Answer> {
    return this.send('POST', path, { ...options, body });
  }

  put(path: string, body?: unknown, options: Options = {}): Promise<Answer> {
    return this.send('PUT', path, { ...options, body });
  }

  delete(path: string, options: Options = {}): Promise<Answer> {
    return this.send('DELETE', path, options);
  }

  /** The value of a cookie, to be compared; undefined where there is none. */
  cookie(name = 'tierwell'): string | undefined {
    return this.#cookies.get(name);
  }

  /** Takes over another browser's cookies: what a thief of one could do. */
  takeCookies(from: TestClient): void {
    for (const [name, value] of from.#cookies) this.#cookies.set(name, value);
  }

  async send(method: string, path: string, { body, headers = {} }: Options): Promise<Answer> {
    const address = new URL(path, this.#url);
    const sent = new Headers({
      Origin: new URL(this.#url).origin,
      [guardHeader]: '1',
      'User-Agent': 'test',
    });
    if (this.#cookies.size > 0) {
      sent.set('Cookie', [...this.#cookies].map(([name, value]) => `${name}=${value}`).join('; '));
    }
    if (body !== undefined && !(body instanceof FormData)) {
      sent.set('Content-Type', 'application/json');
    }
    for (const [name, value] of Object.entries(headers)) {
      if (value === '') sent.delete(name);
      else sent.set(name, value);
    }
    const response = await fetch(address, {
      method,
      headers: sent,
      redirect: 'manual',
      body: readBody(body),
    });
    for (const cookie of response.headers.getSetCookie()) this.#keep(cookie);
    const text = await response.text();
    const isJson = /[/+]json/.test(response.headers.get('Content-Type') ?? '');
    const read: unknown = isJson && text !== '' ? JSON.parse(text) : text;
    return { status: response.status, headers: response.headers, body: read, text };
  }

  #keep(cookie: string): void {
    const [pair = '', ...attributes] = cookie.split(';');
    const [name = '', ...value] = pair.split('=');
    const gone = attributes.some((each) => /^\s*max-age=0\s*$/i.test(each));
    if (gone || value.join('=') === '') this.#cookies.delete(name);
    else this.#cookies.set(name, value.join('='));
  }
}

function readBody(body: unknown): FormData | string | undefined {
  if (body === undefined || body instanceof FormData) return body;
  // A string is sent as it is, so that a test can send what is not JSON.
  return typeof body === 'string' ? body : JSON.stringify(body);
}
