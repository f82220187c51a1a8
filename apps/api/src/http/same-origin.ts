import type { Request } from 'express';
import { AppError } from './app-error.ts';

const CHANGES = new Set(['POST', 'PUT', 'PATCH', 'DELETE']);

/**
 * Refuses a change that a page of another site made the browser send. Browsers name where a request comes from in
 * Sec-Fetch-Site and Origin; a script sends neither and is held to its CSRF token.
 */
export function requireSameOrigin(request: Request, publicUrl: string): void {
  if (!CHANGES.has(request.method)) return;
  const site = request.headers['sec-fetch-site'];
  if (site !== undefined && site !== 'same-origin' && site !== 'none')
    throw new AppError('forbidden', 'The request comes from another site.');
  const origin = request.headers.origin;
  if (origin === undefined || origin === publicUrl) return;
  const host = URL.canParse(origin) ? new URL(origin).host : null;
  if (host === null || host !== request.headers.host)
    throw new AppError('forbidden', 'The request comes from another origin.');
}
