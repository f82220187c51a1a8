import type { Evaluation, PersonRef, Version as VersionView, VersionSummary } from '@tipward/contract';
import type { Version } from '../models/version.ts';
import type { VersionState } from '../models/version-state.ts';

/** A version with all that is told beside it. */
export interface VersionParts {
  readonly version: Version;
  readonly state: VersionState;
  readonly evaluation: Evaluation;
  readonly designName: string;
  readonly programmeId: string;
  readonly programmeName: string;
  readonly parentNumber: number | null;
  readonly author: PersonRef;
}

export const versionLabel = (number: number): string => `v${number}`;

export function presentVersionSummary(parts: VersionParts): VersionSummary {
  const { version, state, evaluation } = parts;
  return {
    id: version.id,
    designId: version.designId,
    designName: parts.designName,
    programmeId: parts.programmeId,
    number: version.number,
    label: versionLabel(version.number),
    note: version.note,
    state: state.state,
    parentId: version.parentId,
    parentLabel: parts.parentNumber === null ? null : versionLabel(parts.parentNumber),
    contentHash: version.contentHash,
    specificationIssue: version.specificationIssue,
    author: parts.author,
    savedAt: version.savedAt.toISOString(),
    keyNumbers: evaluation.keyNumbers,
    verdicts: evaluation.verdicts,
    reviewId: state.reviewId,
    release:
      state.releaseId === null || state.letter === null
        ? null
        : { id: state.releaseId, letter: state.letter },
  };
}

export function presentVersion(parts: VersionParts, abilities: VersionView['abilities']): VersionView {
  return {
    ...presentVersionSummary(parts),
    programmeName: parts.programmeName,
    content: parts.version.content,
    evaluation: parts.evaluation,
    changeSummary: parts.version.changeSummary,
    abilities,
  };
}
