import type {
  Design as DesignView,
  DesignSummary,
  DraftSummary,
  PersonRef,
  VersionSummary,
} from '@tipward/contract';
import type { Design } from '../models/design.ts';

export interface DesignParts {
  readonly design: Design;
  readonly createdBy: PersonRef;
  /** Newest first. */
  readonly versions: readonly VersionSummary[];
}

export function presentDesignSummary({ design, createdBy, versions }: DesignParts): DesignSummary {
  return {
    id: design.id,
    programmeId: design.programmeId,
    name: design.name,
    createdBy,
    createdAt: design.createdAt.toISOString(),
    updatedAt: design.updatedAt.toISOString(),
    versionCount: versions.length,
    latestVersion: versions[0] ?? null,
  };
}

export function presentDesign(
  parts: DesignParts,
  programmeName: string,
  drafts: DraftSummary[],
  abilities: DesignView['abilities'],
): DesignView {
  return { ...presentDesignSummary(parts), programmeName, versions: [...parts.versions], drafts, abilities };
}
