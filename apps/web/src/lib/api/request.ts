import type { Operation } from '@tipward/contract';
import type { z } from 'zod';
import { csrfToken } from './csrf-token.ts';

type Given<S> = S extends z.ZodType ? z.input<S> : never;

type Required<K extends string, S> = S extends z.ZodType
  ? Record<K, Given<S>>
  : Partial<Record<K, undefined>>;

/** What an operation must be called with, by its contract; `query` may be left out. */
export type CallInput<O extends Operation> = Required<'params', O['params']> &
  Required<'body', O['body']> & {
    query?: O['query'] extends z.ZodType ? Given<O['query']> : undefined;
    /** ETag of the state that is edited, verbatim. */
    ifMatch?: string;
    /** The same key for the same intent, so that a repeated request creates once. */
    idempotencyKey?: string;
    signal?: AbortSignal;
  };

interface LooseInput {
  readonly params?: unknown;
  readonly query?: unknown;
  readonly body?: unknown;
  readonly ifMatch?: string;
  readonly idempotencyKey?: string;
  readonly signal?: AbortSignal;
}

const API_BASE = '/api/v1';

/** Address of an operation with its parameters filled in and its query appended; empty query values are left out. */
export function addressOf(operation: Operation, input: Pick<LooseInput, 'params' | 'query'>): string {
  const params = (input.params ?? {}) as Record<string, string>;
  const path = operation.path.replace(/:(\w+)/gu, (_match, name: string) =>
    encodeURIComponent(params[name] ?? ''),
  );
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(input.query ?? {}))
    if (value !== undefined && value !== null && value !== '') query.set(name, String(value));
  const text = query.toString();
  return `${API_BASE}${path}${text === '' ? '' : `?${text}`}`;
}

function headersOf(operation: Operation, input: LooseInput): Headers {
  const headers = new Headers({ Accept: operation.binary ?? 'application/json' });
  const token = csrfToken();
  if (operation.method !== 'get' && token !== null) headers.set('X-CSRF-Token', token);
  if (input.body !== undefined) headers.set('Content-Type', 'application/json');
  if (input.ifMatch !== undefined) headers.set('If-Match', input.ifMatch);
  if (input.idempotencyKey !== undefined) headers.set('Idempotency-Key', input.idempotencyKey);
  return headers;
}

/** Sends one request as its contract says. @throws TypeError when no answer came, AbortError when given up. */
export function sendRequest(operation: Operation, input: LooseInput): Promise<Response> {
  return fetch(addressOf(operation, input), {
    method: operation.method.toUpperCase(),
    headers: headersOf(operation, input),
    credentials: 'same-origin',
    body: input.body === undefined ? null : JSON.stringify(input.body),
    signal: input.signal ?? null,
  });
}
