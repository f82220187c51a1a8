import type PgBoss from 'pg-boss';
import type { Context } from '../context.ts';
import { forgetOldKeys } from '../http/idempotency.ts';
import { createPostman, type Postman } from '../mail/postman.ts';
import { forgetOldSessions } from '../services/auth/forget-old-sessions.ts';
import { createBoss, enqueue } from './create-boss.ts';
import { sendMailJob } from './definitions/send-mail.ts';
import { sendMail } from './handlers/send-mail.ts';
import { relayOutbox } from './relay-outbox.ts';
import { every } from './every.ts';

const RELAY_EVERY_MS = 1000;
const SWEEP_EVERY_MS = 3_600_000;

async function workOnMail(context: Context, boss: PgBoss, postman: Postman): Promise<void> {
  await boss.createQueue(sendMailJob.id);
  await boss.work<unknown>(sendMailJob.id, { pollingIntervalSeconds: 0.5, batchSize: 1 }, async (jobs) => {
    for (const job of jobs) await sendMail(context, postman, sendMailJob.payload.parse(job.data));
  });
}

export interface RunningWorker {
  readonly stop: () => Promise<void>;
}

/** Runs the jobs of the installation until it is stopped. Any number of workers may run side by side. */
export async function startWorker(context: Context): Promise<RunningWorker> {
  const boss = createBoss(context);
  await boss.start();
  const postman = createPostman(context.config);
  const report = (what: string) => (error: unknown) => {
    context.log.error({ err: error }, what);
  };
  const loops = [
    every(SWEEP_EVERY_MS, forgetOldKeys, report('old request keys were not swept')),
    every(SWEEP_EVERY_MS, forgetOldSessions, report('old sessions were not swept')),
  ];
  if (postman === null) context.log.warn('no SMTP_URL: mail waits in the outbox');
  else {
    await workOnMail(context, boss, postman);
    const relay = () => relayOutbox(context, (outboxId) => enqueue(boss, sendMailJob, { outboxId }));
    loops.push(every(RELAY_EVERY_MS, relay, report('the outbox was not read')));
  }
  return {
    stop: async () => {
      await Promise.all(loops.map((stopLoop) => stopLoop()));
      await boss.stop({ graceful: true, timeout: 10_000 });
      postman?.close();
    },
  };
}
