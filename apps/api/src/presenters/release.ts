import type { Release as ReleaseView, ReleaseSummary } from '@tipward/contract';
import type { Decision } from '../models/decision.ts';
import type { Release } from '../models/release.ts';
import type { PersonRefs } from './person-ref.ts';
import type { VersionParts } from './version.ts';
import { versionLabel } from './version.ts';

export interface ReleaseParts {
  /** Without its package. */
  readonly release: Release;
  readonly version: VersionParts;
  readonly decision: Decision;
  /** The release that came right after it, null for the one in force. */
  readonly next: { readonly id: string; readonly letter: string } | null;
  readonly ref: PersonRefs;
}

export function presentReleaseSummary({ release, version, next, ref }: ReleaseParts): ReleaseSummary {
  return {
    id: release.id,
    programmeId: release.programmeId,
    programmeName: version.programmeName,
    letter: release.letter,
    designId: version.version.designId,
    designName: version.designName,
    versionId: release.versionId,
    versionLabel: versionLabel(version.version.number),
    state: next === null ? 'released' : 'superseded',
    effectivity: release.effectivity,
    note: release.note,
    contentHash: version.version.contentHash,
    packageSha256: release.packageSha256,
    packageBytes: release.packageBytes,
    releasedBy: ref(release.releasedBy),
    releasedAt: release.releasedAt.toISOString(),
    supersededBy: next,
  };
}

export function presentRelease(parts: ReleaseParts): ReleaseView {
  return {
    ...presentReleaseSummary(parts),
    content: parts.version.version.content,
    evaluation: parts.version.evaluation,
    approvedBy: parts.ref(parts.decision.decidedBy),
    approvedAt: parts.decision.decidedAt.toISOString(),
    manifest: parts.release.manifest,
  };
}
