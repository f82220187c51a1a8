import type { z } from 'zod';

export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** Who may call at all; finer rights (role in the programme, authorship) are policies of the API. */
export type Access = 'public' | 'signed-in' | 'administrator';

/**
 * One request of the API. `path` is relative to /api/v1 with `:name` parameters.
 * `ifMatch`: the request must carry the ETag it edits. `idempotent`: it may carry an Idempotency-Key.
 * A `response` of null means an empty body; `binary` names the media type of a download.
 */
export interface Operation<
  P extends z.ZodType | null = z.ZodType | null,
  Q extends z.ZodType | null = z.ZodType | null,
  B extends z.ZodType | null = z.ZodType | null,
  R extends z.ZodType | null = z.ZodType | null,
> {
  readonly id: string;
  readonly summary: string;
  readonly method: Method;
  readonly path: string;
  readonly access: Access;
  readonly status: 200 | 201 | 202 | 204;
  readonly params: P;
  readonly query: Q;
  readonly body: B;
  readonly response: R;
  readonly binary?: string;
  readonly ifMatch?: boolean;
  readonly idempotent?: boolean;
}

export function operation<
  P extends z.ZodType | null,
  Q extends z.ZodType | null,
  B extends z.ZodType | null,
  R extends z.ZodType | null,
>(definition: Operation<P, Q, B, R>): Operation<P, Q, B, R> {
  return definition;
}

/** An operation that answers with a file. */
export function download<P extends z.ZodType | null>(
  definition: Operation<P, null, null, null> & { readonly binary: string },
): Operation<P, null, null, null> & { readonly binary: string } {
  return definition;
}

type Parsed<S> = S extends z.ZodType ? z.output<S> : undefined;
type Given<S> = S extends z.ZodType ? z.input<S> : undefined;

export type ParamsOf<O extends Operation> = Parsed<O['params']>;
export type QueryOf<O extends Operation> = Parsed<O['query']>;
export type BodyOf<O extends Operation> = Parsed<O['body']>;
export type BodyInputOf<O extends Operation> = Given<O['body']>;
export type ResponseOf<O extends Operation> = Parsed<O['response']>;
