import { Router, type Request, type RequestHandler, type Response } from 'express';
import { servedOverTls } from '../config/config.ts';
import type { Context } from '../context.ts';
import type { Actor } from '../policies/actor.ts';
import { findSession, type LiveSession } from '../services/auth/find-session.ts';
import { csrfMatches } from '../services/auth/csrf.ts';
import { AppError, forbidden } from './app-error.ts';
import { checkAnswer } from './check-answer.ts';
import { cookiesOf } from './cookies.ts';
import { once, readIdempotencyKey, type StoredAnswer } from './idempotency.ts';
import { readIfMatch, readRequest } from './read-request.ts';
import type { Download, Route } from './route.ts';
import { requireSameOrigin } from './same-origin.ts';

function requireAccess(
  route: Route,
  request: Request,
  session: LiveSession | null,
  context: Context,
): Actor | null {
  const { access, method } = route.operation;
  if (access === 'public') return session?.actor ?? null;
  if (session === null) throw new AppError('not-signed-in', 'Sign in first.');
  if (method !== 'get' && !csrfMatches(context, session.familyId, request.get('x-csrf-token')))
    throw forbidden('The X-CSRF-Token of the session is missing or wrong.');
  if (access === 'administrator' && !session.actor.isAdministrator)
    throw forbidden('Only an administrator may do this.');
  return session.actor;
}

function send(route: Route, response: Response, answer: StoredAnswer): void {
  if (answer.etag !== null) response.set('ETag', answer.etag);
  if (answer.body === undefined || route.operation.response === null) response.status(answer.status).end();
  else response.status(answer.status).json(answer.body);
}

function sendDownload(route: Route, response: Response, file: Download): void {
  response
    .status(route.operation.status)
    .type(route.operation.binary ?? 'application/octet-stream')
    .attachment(file.fileName)
    .send(file.bytes);
}

async function answerCall(
  context: Context,
  route: Route,
  request: Request,
  response: Response,
): Promise<void> {
  const { operation } = route;
  requireSameOrigin(request, context.config.publicUrl);
  const cookies = cookiesOf(request, response, servedOverTls(context.config));
  const session = await findSession(context, cookies);
  const actor = requireAccess(route, request, session, context);
  const { params, query, body } = readRequest(operation, request);
  const ifMatch = readIfMatch(operation, request);
  let etag: string | null = null;
  const setETag = (value: string) => {
    etag = value;
  };
  const familyId = session?.familyId ?? null;
  const call = { context, actor, params, query, body, ifMatch, cookies, familyId, setETag };
  // The contract decides which types these are; the registration in route() tied handler and operation together.
  const run = () => route.handle(call as Parameters<Route['handle']>[0]);

  if (operation.binary !== undefined) {
    sendDownload(route, response, (await run()) as Download);
    return;
  }
  const work = async (): Promise<StoredAnswer> => {
    const answer = await run();
    if (context.config.mode === 'test') checkAnswer(operation, answer);
    return { status: operation.status, body: answer, etag };
  };
  const key = operation.idempotent === true ? readIdempotencyKey(request.get('idempotency-key')) : null;
  const answer =
    key === null || actor === null
      ? await work()
      : await once(actor, operation.id, key, { params, body }, work);
  send(route, response, answer);
}

/** A router with every route, each registered from its operation of the contract. */
export function mountRoutes(context: Context, routes: readonly Route[]): Router {
  const router = Router({ caseSensitive: true, strict: true });
  const seen = new Set<string>();
  for (const route of routes) {
    const { id, method, path } = route.operation;
    if (seen.has(id)) throw new Error(`${id} is registered twice`);
    seen.add(id);
    const handler: RequestHandler = (request, response) => answerCall(context, route, request, response);
    router[method](path, ...route.before.map((make) => make(context)), handler);
  }
  return router;
}
