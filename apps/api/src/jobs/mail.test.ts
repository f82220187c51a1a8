import { setTimeout as pause } from 'node:timers/promises';
import request from 'supertest';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { makePerson } from '../../test/factories.ts';
import { tokenOfLink } from '../../test/links.ts';
import { callAs, nobody } from '../../test/sign-in.ts';
import { useTestApi } from '../../test/test-api.ts';
import { createApp } from '../app.ts';
import type { Context } from '../context.ts';
import { CaughtMail } from '../mail/caught-mail.ts';
import { createPostman } from '../mail/postman.ts';
import { startCatcher, type RunningCatcher } from '../mail/start-catcher.ts';
import { OutboxMail } from '../models/outbox-mail.ts';
import { writeMail } from '../services/mail/write-mail.ts';
import { sendMail } from './handlers/send-mail.ts';
import { relayOutbox } from './relay-outbox.ts';
import { startWorker, type RunningWorker } from './start-worker.ts';

const api = useTestApi({ mailCatcherPort: 1 });
const letter = { kind: 'test', subject: 'Grüße, "quoted" 😀 — λ', text: 'Line one\n\nλ ≤ 7,5\n' };
const put = (to: string) =>
  api().context.db.transaction((transaction) => writeMail(transaction, [to], letter));
const withSmtp = (smtpUrl: string): Context => ({
  ...api().context,
  config: { ...api().context.config, smtpUrl },
});
async function until(what: () => Promise<boolean>): Promise<void> {
  for (let i = 0; i < 200; i += 1) {
    if (await what()) return;
    await pause(50);
  }
  throw new Error('waited ten seconds in vain');
}

let catcher: RunningCatcher | null = null;
let caught: CaughtMail;
const startCatching = async (port = 0) => {
  catcher = await startCatcher(caught, port);
  return catcher;
};
beforeAll(() => {
  const mail = api().context.caughtMail;
  if (mail === null) throw new Error('the catcher of this test is on');
  caught = mail;
});
afterEach(async () => {
  await catcher?.stop();
  catcher = null;
  await OutboxMail.update({ sentAt: new Date() }, { where: { sentAt: null } });
});

describe('the worker', () => {
  let worker: RunningWorker | null = null;
  afterAll(async () => {
    await worker?.stop();
  });

  it('sends what a request wrote, as it was written, and the page of caught mail shows it', async () => {
    const { port } = await startCatching();
    worker = await startWorker(withSmtp(`smtp://127.0.0.1:${port}`));
    const administrator = await callAs(api(), await makePerson(api(), { isAdministrator: true }));
    await administrator.post('/people/invitations', { email: 'mailed@example.org', name: 'Zoë "Z" O’Hara' });
    await put('letters@example.org');
    await until(async () => (await OutboxMail.count({ where: { sentAt: null } })) === 0);
    await worker.stop();
    worker = null;
    const { status, body } = await nobody(api()).get('/dev/mail');
    expect(status).toBe(200);
    const found = (to: string) => body.items.find((mail: { to: string[] }) => mail.to[0] === to);
    expect(found('letters@example.org')).toMatchObject({ subject: letter.subject, text: letter.text });
    const token = tokenOfLink(found('mailed@example.org').text);
    const accepted = await nobody(api()).post('/auth/accept-invitation', {
      token,
      name: 'Zoë',
      password: 'a long enough password',
    });
    expect(accepted.status).toBe(200);
  });
});

describe('one message', () => {
  it('goes out once, however often it is handed out', async () => {
    const { port } = await startCatching();
    const postman = createPostman(withSmtp(`smtp://127.0.0.1:${port}`).config);
    if (postman === null) throw new Error('there is a mail server');
    await put('once@example.org');
    const { id } = await OutboxMail.findOne({
      where: { toAddress: 'once@example.org' },
      rejectOnEmpty: true,
    });
    await Promise.all([1, 2, 3].map(() => sendMail(api().context, postman, { outboxId: id })));
    postman.close();
    expect(caught.list().filter(({ to }) => to[0] === 'once@example.org')).toHaveLength(1);
    const sent = await OutboxMail.findByPk(id, { rejectOnEmpty: true });
    expect([sent.attempts, sent.lastError, sent.sentAt === null]).toEqual([1, null, false]);
  });

  it('stays in the outbox while the mail server is down, and goes out when it is back', async () => {
    const { port } = await startCatching();
    await catcher?.stop();
    catcher = null;
    const postman = createPostman(withSmtp(`smtp://127.0.0.1:${port}`).config);
    if (postman === null) throw new Error('there is a mail server');
    await put('later@example.org');
    const mail = await OutboxMail.findOne({ where: { toAddress: 'later@example.org' }, rejectOnEmpty: true });
    await expect(sendMail(api().context, postman, { outboxId: mail.id })).rejects.toThrow(/ECONNREFUSED/u);
    await mail.reload();
    expect([mail.attempts, mail.sentAt]).toEqual([1, null]);
    expect(mail.lastError).toContain('ECONNREFUSED');
    await startCatching(port);
    await sendMail(api().context, postman, { outboxId: mail.id });
    postman.close();
    await mail.reload();
    expect([mail.attempts, mail.sentAt === null, mail.lastError]).toEqual([2, false, null]);
  });
});

describe('the outbox', () => {
  it('hands each message out once, and again only when its retries must be over', async () => {
    await put('relay@example.org');
    const handed: string[] = [];
    const relay = () =>
      relayOutbox(api().context, (id) => {
        handed.push(id);
        return Promise.resolve();
      });
    await Promise.all([relay(), relay()]);
    await relay();
    expect(handed).toHaveLength(1);
    await OutboxMail.update(
      { queuedAt: new Date(Date.now() - 31 * 60_000) },
      { where: { id: handed[0] ?? '' } },
    );
    await relay();
    expect(handed).toHaveLength(2);
  });

  it('hands nothing out when the queue does not take it', async () => {
    await put('refused@example.org');
    await expect(relayOutbox(api().context, () => Promise.reject(new Error('full')))).rejects.toThrow('full');
    expect(await OutboxMail.count({ where: { toAddress: 'refused@example.org', queuedAt: null } })).toBe(1);
  });
});

it('keeps the last 200 messages', () => {
  const kept = new CaughtMail();
  for (let i = 0; i < 250; i += 1)
    kept.add({ id: String(i), to: [], subject: '', text: '', receivedAt: new Date().toISOString() });
  expect(kept.list()).toHaveLength(200);
  expect(kept.list()[0]?.id).toBe('249');
});

it('has no page of caught mail in production, nor where nothing is caught', async () => {
  const { context } = api();
  const production = createApp({ ...context, config: { ...context.config, mode: 'production' } });
  expect((await request(production).get('/api/v1/dev/mail')).status).toBe(404);
  expect((await request(createApp({ ...context, caughtMail: null })).get('/api/v1/dev/mail')).status).toBe(
    404,
  );
});
