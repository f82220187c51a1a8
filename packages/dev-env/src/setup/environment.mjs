import { join } from 'node:path';
import { ROOT } from './paths.mjs';

/** What server, worker and commands read from their environment. Loopback only: the demo's passwords are public. */
export function serverEnvironment({ port, mailPort, database, secret, mode }) {
  return {
    ...process.env,
    NODE_ENV: mode === 'test' ? 'test' : 'production',
    TIPWARD_MODE: mode,
    TIPWARD_LOG_LEVEL: process.env.TIPWARD_LOG_LEVEL ?? 'warn',
    TIPWARD_HOST: '127.0.0.1',
    TIPWARD_PORT: String(port),
    TIPWARD_PUBLIC_URL: `http://127.0.0.1:${port}`,
    TIPWARD_SECRET: secret,
    DATABASE_URL: database.appUrl,
    SMTP_URL: `smtp://127.0.0.1:${mailPort}`,
    TIPWARD_MAIL_CATCHER: 'on',
    MAIL_CATCHER_PORT: String(mailPort),
    WEB_DIST: join(ROOT, 'apps/web/dist'),
  };
}

/** Migrations and seeds run as the owner of the database. */
export function ownerEnvironment(environment, database) {
  return { ...environment, OWNER_DATABASE_URL: database.ownerUrl };
}
