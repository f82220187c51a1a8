import { randomUUID } from 'node:crypto';
import express, { type Express } from 'express';
import { pinoHttp } from 'pino-http';
import type { Context } from './context.ts';
import { answerNotFound, handleErrors } from './http/handle-errors.ts';
import { mountRoutes } from './http/mount-routes.ts';
import { securityHeaders, serveWeb } from './http/serve-web.ts';
import { routes } from './routes/index.ts';

const BODY_LIMIT = '4mb';

/** Numbers are made below, as text; the logger's type allows more. */
const requestId = (id: unknown): string => (typeof id === 'string' ? id : '');

/** The application without a listening socket. */
export function createApp(context: Context): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('etag', false);
  app.set('query parser', 'simple');
  app.use(
    pinoHttp({
      logger: context.log,
      genReqId: () => randomUUID(),
      // Who asked what, and how it ended; no headers, so no cookie or token ever stands in a log.
      serializers: {
        req: ({ id, method, url }: { id: unknown; method: string; url: string }) => ({ id, method, url }),
        res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
      },
      customLogLevel: (_request, response, error) =>
        error !== undefined || response.statusCode >= 500 ? 'error' : 'info',
    }),
  );
  app.use((request, response, next) => {
    response.set('X-Request-Id', requestId(request.id));
    next();
  });
  app.use(securityHeaders(context.config));
  const api = express.Router();
  api.use((_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  api.use(express.json({ limit: BODY_LIMIT, strict: false }));
  api.use(mountRoutes(context, routes));
  api.use(answerNotFound);
  app.use('/api/v1', api);
  if (context.config.webDist !== null) app.use(serveWeb(context.config.webDist));
  app.use(answerNotFound);
  app.use(handleErrors);
  return app;
}
