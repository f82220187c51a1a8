import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import type { Context } from '../context.ts';
import { AppError } from './app-error.ts';

const QUARTER_MS = 15 * 60 * 1000;
/** Failures allowed from one address, for all accounts together: someone trying one password on many accounts. */
const PER_ADDRESS_FACTOR = 10;

function emailOf(request: Request): string {
  const body: unknown = request.body;
  const email = typeof body === 'object' && body !== null ? (body as { email?: unknown }).email : undefined;
  return typeof email === 'string' ? email.trim().toLowerCase().slice(0, 254) : '';
}

const addressOf = (request: Request): string => ipKeyGenerator(request.ip ?? '');

function limit(allowed: number, onlyFailures: boolean, keyOf: (request: Request) => string): RequestHandler {
  return rateLimit({
    windowMs: QUARTER_MS,
    limit: allowed,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    skipSuccessfulRequests: onlyFailures,
    keyGenerator: keyOf,
    handler: (_request, _response, next) => {
      next(
        new AppError('too-many-requests', 'Too many attempts; wait a quarter of an hour.', {
          retryAfterSeconds: QUARTER_MS / 1000,
        }),
      );
    },
  });
}

/*
 * The counts are held in memory: each server process counts for itself and forgets when it stops. With several servers
 * behind one address an attacker gets that many times the attempts.
 */

/** Failed sign-ins: a few for each account from one address, more for one address in all. */
export const signInLimits: readonly ((context: Context) => RequestHandler)[] = [
  ({ config }) => limit(config.signInFailuresAllowed * PER_ADDRESS_FACTOR, true, addressOf),
  ({ config }) =>
    limit(config.signInFailuresAllowed, true, (request) => `${addressOf(request)} ${emailOf(request)}`),
];

/** Reset mails: every request counts, since each one may send a message. */
export const resetLimits: readonly ((context: Context) => RequestHandler)[] = [
  ({ config }) => limit(config.signInFailuresAllowed * PER_ADDRESS_FACTOR, false, addressOf),
  ({ config }) =>
    limit(config.signInFailuresAllowed, false, (request) => `${addressOf(request)} ${emailOf(request)}`),
];

/** Guesses at the token of a link. */
export const linkLimits: readonly ((context: Context) => RequestHandler)[] = [
  ({ config }) => limit(config.signInFailuresAllowed * PER_ADDRESS_FACTOR, true, addressOf),
];
