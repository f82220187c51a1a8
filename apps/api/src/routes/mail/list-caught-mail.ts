import { listCaughtMail } from '@tipward/contract';
import { notFound } from '../../http/app-error.ts';
import { publicRoute } from '../../http/route.ts';

/** There only where mail is caught on this machine; elsewhere the address does not exist. */
export const listCaughtMailRoute = publicRoute(listCaughtMail, ({ context }) => {
  if (context.caughtMail === null || context.config.mode === 'production')
    return Promise.reject(notFound('Caught mail'));
  return Promise.resolve({ items: [...context.caughtMail.list()] });
});
