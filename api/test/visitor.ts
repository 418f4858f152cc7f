import { gzipSync } from 'node:zlib';

export type Answer = {
  readonly status: number;
  readonly headers: Headers;
  /** Parsed JSON; undefined where the body is empty. */
  readonly body: Record<string, unknown>;
  readonly text: string;
};

type SendOptions = { readonly contentType?: string; readonly headers?: Record<string, string> };

/** One browser: it keeps the refresh cookie and sends the access token that it was given. */
export class Visitor {
  cookie: string | null = null;
  accessToken: string | null = null;

  constructor(private readonly url: string) {}

  get(path: string): Promise<Answer> {
    return this.send('GET', path, undefined);
  }

  post(path: string, body: unknown = {}, options: SendOptions = {}): Promise<Answer> {
    return this.send('POST', path, body, options);
  }

  patch(path: string, body: unknown): Promise<Answer> {
    return this.send('PATCH', path, body);
  }

  postGzip(path: string, body: Buffer): Promise<Answer> {
    return this.send('POST', path, gzipSync(body), { headers: { 'Content-Encoding': 'gzip' } });
  }

  async send(method: string, path: string, body: unknown, options: SendOptions = {}): Promise<Answer> {
    const headers: Record<string, string> = { ...options.headers };
    if (body !== undefined) headers['Content-Type'] = options.contentType ?? 'application/json';
    if (this.accessToken) headers.Authorization = `Bearer ${this.accessToken}`;
    if (this.cookie && path.startsWith('/api/accounts')) headers.Cookie = this.cookie;
    const sent = body === undefined ? null : isRaw(body) ? body : JSON.stringify(body);
    const response = await fetch(this.url + path, { method, headers, body: sent, redirect: 'manual' });
    this.keepCookie(response.headers.getSetCookie());
    const text = await textOf(response);
    const isJson = response.headers.get('content-type')?.startsWith('application/json') && text !== '';
    const parsed = isJson ? (JSON.parse(text) as Record<string, unknown>) : {};
    return { status: response.status, headers: response.headers, body: parsed, text };
  }

  /** Signs in and keeps what it was given. */
  async signIn(email: string, password: string, deviceId = 'phone001'): Promise<Answer> {
    const answer = await this.post('/api/accounts/sign-in', {
      email,
      password,
      deviceId,
      deviceName: 'Phone',
    });
    if (answer.status === 200) this.accessToken = answer.body.accessToken as string;
    return answer;
  }

  private keepCookie(setCookies: string[]): void {
    const refresh = setCookies.find((line) => line.startsWith('harkmoor_refresh_'));
    if (!refresh) return;
    const value = refresh.split(';', 1)[0]!;
    this.cookie = value.endsWith('=') ? null : value;
  }
}

function isRaw(body: unknown): body is string | Uint8Array<ArrayBuffer> {
  return typeof body === 'string' || body instanceof Uint8Array;
}

/** A stream has no end to wait for: its beginning stands for it. */
async function textOf(response: Response): Promise<string> {
  if (!response.headers.get('content-type')?.startsWith('text/event-stream')) return response.text();
  const reader = response.body!.getReader();
  const { value } = await reader.read();
  await reader.cancel();
  return new TextDecoder().decode(value);
}
