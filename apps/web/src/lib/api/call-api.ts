import { getSession } from '@tipward/contract';
import type { Operation, ResponseOf, Session } from '@tipward/contract';
import { readProblem, unreachable } from './api-problem.ts';
import { rememberCsrfToken } from './csrf-token.ts';
import { refreshOnce } from './refresh-once.ts';
import { sendRequest } from './request.ts';
import type { CallInput } from './request.ts';

/** The 401 of a public operation means what it says: a wrong password, a spent link. Asking who is signed in is not meant. */
const neverRenewed = (operation: Operation) =>
  operation.access === 'public' && operation.id !== getSession.id;

/** Operations that answer with the session bring its CSRF token. */
function bringsToken(body: unknown): body is Session {
  return typeof body === 'object' && body !== null && 'csrfToken' in body;
}

function isAbort(error: unknown): boolean {
  return error instanceof DOMException && error.name === 'AbortError';
}

async function send(operation: Operation, input: object): Promise<Response> {
  try {
    const response = await sendRequest(operation, input);
    if (response.status !== 401 || neverRenewed(operation)) return response;
    const renewed = await refreshOnce();
    // Asking who is signed in has an answer even when nobody is.
    return renewed || operation.id === getSession.id ? await sendRequest(operation, input) : response;
  } catch (error) {
    if (isAbort(error)) throw error;
    throw unreachable();
  }
}

/**
 * Calls an operation and gives its answer with its ETag (null where it has none).
 * An expired session is renewed once, and the request repeated.
 * @throws ApiProblem with code and faults when refused, with code 'unreachable' when no answer came
 */
export async function callApiTagged<O extends Operation>(
  operation: O,
  input: CallInput<O>,
): Promise<{ body: ResponseOf<O>; etag: string | null }> {
  const response = await send(operation, input);
  if (!response.ok) throw await readProblem(response);
  const body: unknown = operation.response === null ? undefined : await response.json();
  if (bringsToken(body)) rememberCsrfToken(body.csrfToken);
  return { body: body as ResponseOf<O>, etag: response.headers.get('ETag') };
}

/** As `callApiTagged`, the answer alone. */
export async function callApi<O extends Operation>(
  operation: O,
  input: CallInput<O>,
): Promise<ResponseOf<O>> {
  return (await callApiTagged(operation, input)).body;
}

/**
 * Fetches a download with the session of the page, so that an expired one is renewed first.
 * @returns the bytes and the file name the server gives them
 */
export async function fetchFile<O extends Operation>(
  operation: O,
  input: CallInput<O>,
): Promise<{ blob: Blob; fileName: string | null }> {
  const response = await send(operation, input);
  if (!response.ok) throw await readProblem(response);
  const named = /filename="([^"]+)"/u.exec(response.headers.get('Content-Disposition') ?? '');
  return { blob: await response.blob(), fileName: named?.[1] ?? null };
}
