import { z } from 'zod';
import type { JobDefinition } from './job-definition.ts';

/** Sends one message of the outbox. Retries run over about a quarter of an hour; then the outbox hands it out anew. */
export const sendMailJob = {
  id: 'mail.send',
  payload: z.object({ outboxId: z.uuid() }),
  retryLimit: 8,
  retryDelay: 2,
  expireInSeconds: 120,
} satisfies JobDefinition;
