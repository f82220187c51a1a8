import type { AuditEvent } from '@tipward/contract';
import { csvOf } from '../../../lib/files/csv.ts';

const HEADER = [
  'sequence',
  'at',
  'actor',
  'action',
  'subject kind',
  'subject id',
  'programme id',
  'detail',
  'previous hash',
  'hash',
];

/** The events with their hashes, so that the chain can be checked from the file. */
export function eventsCsv(events: readonly AuditEvent[]): string {
  return csvOf(
    HEADER,
    events.map((event) => [
      event.sequence,
      event.at,
      event.actor?.name ?? null,
      event.action,
      event.subjectKind,
      event.subjectId,
      event.programmeId,
      JSON.stringify(event.detail),
      event.previousHash,
      event.hash,
    ]),
  );
}
