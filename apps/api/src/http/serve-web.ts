import { randomBytes } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import express, { Router, type Response } from 'express';
import helmet from 'helmet';
import { servedOverTls, type Config } from '../config/config.ts';
import { pagePolicy } from './content-security-policy.ts';

const YEAR_SECONDS = 31_536_000;
const NONCE_PLACE = '__CSP_NONCE__';

/** Security headers of every answer; the policy is that of a page, with a fresh nonce for its style elements. */
export function securityHeaders(config: Config): express.RequestHandler {
  return (request, response, next) => {
    const nonce = randomBytes(16).toString('base64');
    response.locals['nonce'] = nonce;
    helmet({
      contentSecurityPolicy: { useDefaults: false, directives: pagePolicy(nonce) },
      strictTransportSecurity: servedOverTls(config) ? { maxAge: YEAR_SECONDS } : false,
      crossOriginEmbedderPolicy: false,
      referrerPolicy: { policy: 'same-origin' },
      frameguard: { action: 'deny' },
    })(request, response, next);
  };
}

function sendPage(response: Response, page: string): void {
  response
    .set('Cache-Control', 'no-store')
    .type('html')
    .send(page.replaceAll(NONCE_PLACE, String(response.locals['nonce'])));
}

/**
 * The built web application. Files under /assets carry their hash in the name and never change; every other address is a
 * view of the application and gets its page, fresh each time.
 */
export function serveWeb(webDist: string): Router {
  const router = Router();
  const page = readFileSync(join(webDist, 'index.html'), 'utf8');
  router.use(
    '/assets',
    express.static(join(webDist, 'assets'), { immutable: true, maxAge: '1y', index: false }),
  );
  router.get(/^\/(?:index\.html)?$/u, (_request, response) => {
    sendPage(response, page);
  });
  router.use(express.static(webDist, { index: false, maxAge: '1h' }));
  router.get(/^\/(?!assets\/|api\/).*/u, (request, response, next) => {
    if (request.accepts(['html', 'json']) === 'html') sendPage(response, page);
    else next();
  });
  return router;
}
