import { z } from 'zod';
import type { Config } from './config.ts';
import { ConfigError } from './config-error.ts';

type Environment = Readonly<Record<string, string | undefined>>;

const port = (name: string) =>
  z.coerce
    .number({ error: `${name} is not a number; allowed: 1 to 65535` })
    .int(`${name} is not whole; allowed: 1 to 65535`)
    .min(1, `${name} is out of range; allowed: 1 to 65535`)
    .max(65535, `${name} is out of range; allowed: 1 to 65535`);

const environment = z.object({
  TIPWARD_MODE: z.enum(['demo', 'production', 'test'], {
    error: 'TIPWARD_MODE is unknown; allowed: demo, production, test',
  }),
  TIPWARD_HOST: z.string().default('127.0.0.1'),
  TIPWARD_PORT: port('TIPWARD_PORT').default(4180),
  TIPWARD_PUBLIC_URL: z
    .url({ protocol: /^https?$/u, error: 'TIPWARD_PUBLIC_URL is not an http(s) address' })
    .transform((url) => new URL(url).origin),
  DATABASE_URL: z.string({ error: 'DATABASE_URL is missing; allowed: a postgres:// address of tipward_app' }),
  TIPWARD_SECRET: z
    .string({ error: 'TIPWARD_SECRET is missing; allowed: at least 32 characters' })
    .min(32, 'TIPWARD_SECRET is too short; allowed: at least 32 characters'),
  SMTP_URL: z.string().optional(),
  TIPWARD_MAIL_FROM: z.string().default('Tipward <tipward@localhost.localdomain>'),
  TIPWARD_MAIL_CATCHER: z
    .enum(['on', 'off'], { error: 'TIPWARD_MAIL_CATCHER is unknown; allowed: on, off' })
    .default('off'),
  MAIL_CATCHER_PORT: port('MAIL_CATCHER_PORT').default(4125),
  WEB_DIST: z.string().optional(),
  TIPWARD_LOG_LEVEL: z.enum(['silent', 'fatal', 'error', 'warn', 'info', 'debug', 'trace']).default('info'),
});

/**
 * Reads and checks the environment.
 * @throws ConfigError naming every variable that is missing or wrong.
 */
export function readConfig(env: Environment): Config {
  const parsed = environment.safeParse(env);
  if (!parsed.success) throw new ConfigError(parsed.error.issues.map((issue) => issue.message));
  const values = parsed.data;
  const catcherOn = values.TIPWARD_MAIL_CATCHER === 'on' && values.TIPWARD_MODE !== 'production';
  if (values.TIPWARD_MODE === 'production' && values.SMTP_URL === undefined)
    throw new ConfigError(['SMTP_URL is missing; allowed: smtp://host:port of the mail server']);
  return {
    mode: values.TIPWARD_MODE,
    host: values.TIPWARD_HOST,
    port: values.TIPWARD_PORT,
    publicUrl: values.TIPWARD_PUBLIC_URL,
    databaseUrl: values.DATABASE_URL,
    secret: values.TIPWARD_SECRET,
    smtpUrl: values.SMTP_URL ?? (catcherOn ? `smtp://127.0.0.1:${values.MAIL_CATCHER_PORT}` : null),
    mailFrom: values.TIPWARD_MAIL_FROM,
    mailCatcherPort: catcherOn ? values.MAIL_CATCHER_PORT : null,
    webDist: values.WEB_DIST ?? null,
    logLevel: values.TIPWARD_LOG_LEVEL,
    passwordCost: values.TIPWARD_MODE === 'test' ? 4 : 12,
    signInFailuresAllowed: 10,
    databasePoolSize: 10,
  };
}
