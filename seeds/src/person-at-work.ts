import type { BodyInputOf, Operation, ParamsOf, ResponseOf } from '@tipward/contract';
import { session, signIn } from '@tipward/contract';

interface Given<O extends Operation> {
  readonly params?: ParamsOf<O>;
  readonly body?: BodyInputOf<O>;
  readonly ifMatch?: string;
}

/** A person of the demo, signed in, who sends requests as their browser would. */
export class PersonAtWork {
  readonly #origin: string;
  readonly #publicOrigin: string;
  readonly #cookie: string;
  readonly #csrfToken: string;

  private constructor(origin: string, publicOrigin: string, cookie: string, csrfToken: string) {
    this.#origin = origin;
    this.#publicOrigin = publicOrigin;
    this.#cookie = cookie;
    this.#csrfToken = csrfToken;
  }

  static async signIn(
    origin: string,
    publicOrigin: string,
    email: string,
    password: string,
  ): Promise<PersonAtWork> {
    const answer = await fetch(`${origin}/api/v1${signIn.path}`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', Origin: publicOrigin },
      body: JSON.stringify({ email, password }),
    });
    if (!answer.ok) throw new Error(`${email} could not sign in: ${await answer.text()}`);
    const cookie = answer.headers
      .getSetCookie()
      .map((line) => line.split(';')[0])
      .join('; ');
    const { csrfToken } = session.parse(await answer.json());
    if (csrfToken === null) throw new Error(`${email} was given no token`);
    return new PersonAtWork(origin, publicOrigin, cookie, csrfToken);
  }

  /** Calls an operation; throws with the problem's text when it is refused. */
  async call<O extends Operation>(
    operation: O,
    { params, body, ifMatch }: Given<O> = {},
  ): Promise<ResponseOf<O>> {
    const values = (params ?? {}) as Record<string, string>;
    const path = operation.path.replace(/:(\w+)/gu, (_, name: string) =>
      encodeURIComponent(values[name] ?? ''),
    );
    const answer = await fetch(`${this.#origin}/api/v1${path}`, {
      method: operation.method.toUpperCase(),
      headers: {
        Cookie: this.#cookie,
        Origin: this.#publicOrigin,
        'X-CSRF-Token': this.#csrfToken,
        ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
        ...(ifMatch === undefined ? {} : { 'If-Match': ifMatch }),
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
    if (!answer.ok)
      throw new Error(`${operation.id} was refused with ${answer.status}: ${await answer.text()}`);
    if (operation.response === null) return undefined as ResponseOf<O>;
    return operation.response.parse(await answer.json()) as ResponseOf<O>;
  }
}
