import type { RequestHandler } from 'express';
import type { BodyOf, Operation, ParamsOf, QueryOf, ResponseOf } from '@tipward/contract';
import type { Context } from '../context.ts';
import type { Actor } from '../policies/actor.ts';
import type { Cookies } from './cookies.ts';

/** A file as the answer to an operation whose contract names a `binary` media type. */
export interface Download {
  readonly bytes: Buffer;
  readonly fileName: string;
}

/** One call of an operation, checked against the contract. */
export interface Call<O extends Operation, A extends Actor | null> {
  readonly context: Context;
  readonly actor: A;
  readonly params: ParamsOf<O>;
  readonly query: QueryOf<O>;
  readonly body: BodyOf<O>;
  /** The ETag of If-Match; the empty string where the contract asks for none. */
  readonly ifMatch: string;
  readonly cookies: Cookies;
  /** Family of the session that asks, null for nobody. */
  readonly familyId: string | null;
  /** Names the state that is answered, so that it can be edited. */
  readonly setETag: (etag: string) => void;
}

export type Answer<O extends Operation> = O['binary'] extends string
  ? Download
  : O['response'] extends null
    ? undefined
    : ResponseOf<O>;

export interface Route {
  readonly operation: Operation;
  readonly before: readonly ((context: Context) => RequestHandler)[];
  readonly handle: (call: Call<Operation, never>) => Promise<unknown>;
}

interface Options {
  /** Middleware that needs the context, such as a rate limit; runs after the body is read. */
  readonly before?: readonly ((context: Context) => RequestHandler)[];
}

/** Ties a handler to an operation of the contract that needs a session. */
export function route<O extends Operation>(
  operation: O,
  handle: (call: Call<O, Actor>) => Promise<Answer<O>>,
  options: Options = {},
): Route {
  if (operation.access === 'public') throw new Error(`${operation.id} is public: use publicRoute`);
  return { operation, before: options.before ?? [], handle };
}

/** Ties a handler to an operation that anyone may call; the actor is null for nobody. */
export function publicRoute<O extends Operation>(
  operation: O,
  handle: (call: Call<O, Actor | null>) => Promise<Answer<O>>,
  options: Options = {},
): Route {
  if (operation.access !== 'public') throw new Error(`${operation.id} needs a session: use route`);
  return { operation, before: options.before ?? [], handle };
}
