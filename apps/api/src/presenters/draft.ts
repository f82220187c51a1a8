import type { Draft as DraftView, DraftSummary } from '@tipward/contract';
import type { Draft } from '../models/draft.ts';
import { versionLabel } from './version.ts';

export interface DraftParts {
  readonly draft: Draft;
  readonly designName: string;
  readonly programmeId: string;
  readonly programmeName: string;
  readonly parentNumber: number | null;
}

export function presentDraftSummary({ draft, ...parts }: DraftParts): DraftSummary {
  return {
    id: draft.id,
    designId: draft.designId,
    designName: parts.designName,
    programmeId: parts.programmeId,
    programmeName: parts.programmeName,
    parentVersionId: draft.parentVersionId,
    parentLabel: parts.parentNumber === null ? null : versionLabel(parts.parentNumber),
    updatedAt: draft.updatedAt.toISOString(),
    createdAt: draft.createdAt.toISOString(),
  };
}

export function presentDraft(parts: DraftParts): DraftView {
  return { ...presentDraftSummary(parts), revision: parts.draft.revision, content: parts.draft.content };
}
