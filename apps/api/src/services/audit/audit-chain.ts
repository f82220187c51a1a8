import { createHash } from 'node:crypto';
import { canonicalJson } from '@tipward/design-model';

export interface AuditLink {
  readonly sequence: number;
  readonly at: string;
  readonly actorId: string | null;
  readonly action: string;
  readonly subjectKind: string;
  readonly subjectId: string | null;
  readonly programmeId: string | null;
  readonly detail: Record<string, unknown>;
  readonly previousHash: string;
  readonly hash: string;
}

/** What the first event holds in place of an earlier hash. */
export const GENESIS_HASH = '0'.repeat(64);

/** SHA-256 of the canonical JSON of the event, the hash before it included. */
export function hashOf(link: Omit<AuditLink, 'hash'>): string {
  const { sequence, at, actorId, action, subjectKind, subjectId, programmeId, detail, previousHash } = link;
  const event = { sequence, at, actorId, action, subjectKind, subjectId, programmeId, detail, previousHash };
  return createHash('sha256').update(canonicalJson(event)).digest('hex');
}

/** Whether a link follows the one before it and is what its hash says. */
export function linkHolds(link: AuditLink, before: { sequence: number; hash: string }): boolean {
  return (
    link.sequence === before.sequence + 1 && link.previousHash === before.hash && link.hash === hashOf(link)
  );
}
