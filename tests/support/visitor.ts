import type { Person } from '#shared/api/people.ts';
import { demandDeclared } from './declared.ts';

export interface Reply {
  status: number;
  headers: Headers;
  /** The parsed body; undefined where there was none. */
  body: unknown;
}

interface Options {
  body?: unknown;
  /** Sent as it is, in place of `body`. */
  raw?: string;
  version?: number;
  headers?: Record<string, string>;
}

/**
 * Somebody with a browser: keeps the cookies, sends what a browser would send. A problem that the
 * API's document does not name fails the test.
 */
export class Visitor {
  readonly #cookies: Map<string, string>;

  /** @param like whose cookies it begins with: the same browser at another address */
  constructor(
    readonly base: string,
    like?: Visitor,
  ) {
    this.#cookies = new Map(like ? like.#cookies : []);
  }

  async ask(method: string, path: string, options: Options = {}): Promise<Reply> {
    const { body, raw, version, headers } = options;
    const content = raw ?? (body === undefined ? undefined : JSON.stringify(body));
    const response = await fetch(this.base + path, {
      method: method.toUpperCase(),
      redirect: 'manual',
      headers: {
        'Sec-Fetch-Site': 'same-origin',
        ...(content !== undefined && { 'Content-Type': 'application/json' }),
        ...(version !== undefined && { 'If-Match': `"${version}"` }),
        ...(this.#cookies.size > 0 && { Cookie: this.cookie }),
        ...headers,
      },
      ...(content !== undefined && { body: content }),
    });
    this.#take(response);
    const text = await textOf(response);
    const reply = { status: response.status, headers: response.headers, body: parsed(text) };
    demandDeclared(method.toUpperCase(), path, reply.body);
    return reply;
  }

  get(path: string) {
    return this.ask('GET', path);
  }

  post(path: string, body: unknown, version?: number) {
    return this.ask('POST', path, { body, version });
  }

  put(path: string, body: unknown, version?: number) {
    return this.ask('PUT', path, { body, version });
  }

  patch(path: string, body: unknown, version?: number) {
    return this.ask('PATCH', path, { body, version });
  }

  get cookie(): string {
    return [...this.#cookies].map(([name, value]) => `${name}=${value}`).join('; ');
  }

  #take(response: Response): void {
    for (const line of response.headers.getSetCookie()) {
      const [, name = '', value = ''] = /^([^=]+)=([^;]*)/.exec(line) ?? [];
      if (value === '') this.#cookies.delete(name);
      else this.#cookies.set(name, value);
    }
  }
}

/** A stream has no end to wait for. */
async function textOf(response: Response): Promise<string> {
  const isStream = response.headers.get('content-type')?.startsWith('text/event-stream');
  if (!isStream) return response.text();
  await response.body?.cancel();
  return '';
}

function parsed(text: string): unknown {
  try {
    return text === '' ? undefined : JSON.parse(text);
  } catch {
    return text;
  }
}

export const PASSWORD = 'a long enough password';
let people = 0;

/** A new person with a brewery of their own, signed in. */
export async function newcomer(
  base: string,
  breweryName = 'Test brewery',
): Promise<{ visitor: Visitor; person: Person; slug: string; email: string }> {
  people += 1;
  const visitor = new Visitor(base);
  const email = `brewer-${process.pid}-${people}@saltmarsh.example`;
  const body = { name: `Brewer ${people}`, email, password: PASSWORD, breweryName };
  const { status, body: answer } = await visitor.post('/api/account', body);
  if (status !== 201) throw new Error(`Signing up answered ${status}: ${JSON.stringify(answer)}`);
  const person = answer as Person;
  return { visitor, person, email, slug: person.breweries[0]?.brewery.slug ?? '' };
}
