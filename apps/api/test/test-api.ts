import type { Express } from 'express';
import { afterAll, beforeAll } from 'vitest';
import { createApp } from '../src/app.ts';
import type { Config } from '../src/config/config.ts';
import { closeContext, createContext, type Context } from '../src/context.ts';
import { CaughtMail } from '../src/mail/caught-mail.ts';
import { createTestDatabase, type TestDatabase } from './test-database.ts';

export interface TestApi {
  readonly app: Express;
  readonly context: Context;
  readonly database: TestDatabase;
}

export const PUBLIC_URL = 'http://tipward.test';

function testConfig(databaseUrl: string): Config {
  return {
    mode: 'test',
    host: '127.0.0.1',
    port: 0,
    publicUrl: PUBLIC_URL,
    databaseUrl,
    secret: 'a secret that only the tests of this repository use',
    smtpUrl: null,
    mailFrom: 'Tipward <tipward@example.org>',
    mailCatcherPort: null,
    webDist: null,
    logLevel: process.env['TIPWARD_LOG_LEVEL'] ?? 'error',
    passwordCost: 4,
    signInFailuresAllowed: 5,
    databasePoolSize: 5,
  };
}

/** Starts the API on a database of its own for the tests of one file. Read `api()` inside tests and hooks. */
export function useTestApi(overrides: Partial<Config> = {}): () => TestApi {
  let running: TestApi | null = null;
  beforeAll(async () => {
    const database = await createTestDatabase();
    const config = { ...testConfig(database.appUrl), ...overrides };
    const context = createContext(config, config.mailCatcherPort === null ? null : new CaughtMail());
    running = { app: createApp(context), context, database };
  });
  afterAll(async () => {
    if (running === null) return;
    await closeContext(running.context);
    await running.database.drop();
  });
  return () => {
    if (running === null) throw new Error('the API starts in beforeAll: read it inside a test');
    return running;
  };
}
