import { z } from 'zod';
import { personRef } from '../people/person.ts';

/** One link of the audit chain: `hash` is SHA-256 over the canonical event with `previousHash`. */
export const auditEvent = z.object({
  sequence: z.number(),
  at: z.string(),
  actor: personRef.nullable(),
  action: z.string(),
  subjectKind: z.string(),
  subjectId: z.string().nullable(),
  programmeId: z.string().nullable(),
  detail: z.record(z.string(), z.unknown()),
  previousHash: z.string(),
  hash: z.string(),
});
export type AuditEvent = z.infer<typeof auditEvent>;
