import type { Logger } from 'pino';
import { pino } from 'pino';
import type { Sequelize } from 'sequelize';
import type { Config } from './config/config.ts';
import { connect } from './db/connect.ts';
import type { CaughtMail } from './mail/caught-mail.ts';

/** What every service is given: settings, the database, the log. One per process. */
export interface Context {
  readonly config: Config;
  readonly db: Sequelize;
  readonly log: Logger;
  /** Mail caught on this machine; null when the catcher is off. */
  readonly caughtMail: CaughtMail | null;
}

export function createContext(config: Config, caughtMail: CaughtMail | null = null): Context {
  return {
    config,
    db: connect(config.databaseUrl, config.databasePoolSize),
    log: pino({ level: config.logLevel }),
    caughtMail,
  };
}

export async function closeContext(context: Context): Promise<void> {
  await context.db.close();
}
