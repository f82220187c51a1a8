import type { AuditEvent } from '@tipward/contract';
import type { PersonRefs } from './person-ref.ts';

export interface AuditRow {
  readonly sequence: number;
  readonly at: Date;
  readonly actorId: string | null;
  readonly action: string;
  readonly subjectKind: string;
  readonly subjectId: string | null;
  readonly programmeId: string | null;
  readonly detail: Record<string, unknown>;
  readonly previousHash: string;
  readonly hash: string;
}

export function presentAuditEvent(row: AuditRow, ref: PersonRefs): AuditEvent {
  return {
    sequence: row.sequence,
    at: row.at.toISOString(),
    actor: row.actorId === null ? null : ref(row.actorId),
    action: row.action,
    subjectKind: row.subjectKind,
    subjectId: row.subjectId,
    programmeId: row.programmeId,
    detail: row.detail,
    previousHash: row.previousHash,
    hash: row.hash,
  };
}
