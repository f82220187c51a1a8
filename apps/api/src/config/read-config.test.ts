import { describe, expect, it } from 'vitest';
import { openSeeding } from '../seeding.ts';
import { ConfigError } from './config-error.ts';
import { readConfig } from './read-config.ts';

const env = {
  TIPWARD_MODE: 'demo',
  TIPWARD_PUBLIC_URL: 'http://127.0.0.1:4180/',
  DATABASE_URL: 'postgres://tipward_app:x@127.0.0.1/tipward',
  TIPWARD_SECRET: 's'.repeat(32),
};
function faultsOf(given: Record<string, string | undefined>): readonly string[] {
  try {
    readConfig(given);
  } catch (error) {
    if (error instanceof ConfigError) return error.faults;
    throw error;
  }
  return [];
}

describe('the configuration', () => {
  it('is read, with loopback and twelve rounds of hashing by default', () => {
    expect(readConfig(env)).toMatchObject({
      host: '127.0.0.1',
      publicUrl: 'http://127.0.0.1:4180',
      passwordCost: 12,
      smtpUrl: null,
      mailCatcherPort: null,
    });
  });

  it('names everything that is missing or wrong at once', () => {
    const faults = faultsOf({ TIPWARD_MODE: 'live', TIPWARD_PORT: '99999', TIPWARD_SECRET: 'sesame' });
    expect(faults).toHaveLength(5);
    for (const name of [
      'TIPWARD_MODE',
      'TIPWARD_PORT',
      'TIPWARD_PUBLIC_URL',
      'DATABASE_URL',
      'TIPWARD_SECRET',
    ])
      expect(faults.some((fault) => fault.includes(name))).toBe(true);
    expect(faults.join()).not.toContain('sesame');
  });

  it('catches mail when told to, but never in production', () => {
    const on = { ...env, TIPWARD_MAIL_CATCHER: 'on', MAIL_CATCHER_PORT: '4999' };
    expect(readConfig(on)).toMatchObject({ mailCatcherPort: 4999, smtpUrl: 'smtp://127.0.0.1:4999' });
    const production = { ...on, TIPWARD_MODE: 'production' };
    expect(faultsOf(production)).toEqual([expect.stringContaining('SMTP_URL is missing')]);
    expect(readConfig({ ...production, SMTP_URL: 'smtp://mail.example' }).mailCatcherPort).toBeNull();
  });
});

it('opens no production for seeding', () => {
  const production = { ...env, TIPWARD_MODE: 'production', SMTP_URL: 'smtp://mail.example' };
  expect(() => openSeeding(production)).toThrow(/TIPWARD_MODE is production/u);
});
