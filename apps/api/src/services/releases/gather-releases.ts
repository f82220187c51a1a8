import { Decision } from '../../models/decision.ts';
import { Release } from '../../models/release.ts';
import type { ReleaseParts } from '../../presenters/release.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';
import { gatherVersions } from '../versions/gather-versions.ts';

/** Releases of a programme, newest first, each with its version and the decision that approved it. */
export async function gatherReleases(programmeId: string): Promise<ReleaseParts[]> {
  const releases = await Release.findAll({
    where: { programmeId },
    attributes: { exclude: ['package'] },
    order: [['sequence', 'DESC']],
  });
  const [versions, decisions] = await Promise.all([
    gatherVersions({ id: releases.map((release) => release.versionId) }),
    Decision.findAll({
      where: { versionId: releases.map((release) => release.versionId), outcome: 'approved' },
      order: [['decidedAt', 'DESC']],
    }),
  ]);
  const ref = await loadPersonRefs([
    ...releases.map((release) => release.releasedBy),
    ...decisions.map((decision) => decision.decidedBy),
  ]);
  return releases.map((release, i) => {
    const version = versions.find((parts) => parts.version.id === release.versionId);
    const decision = decisions.find((row) => row.versionId === release.versionId);
    if (version === undefined || decision === undefined)
      throw new Error(`release ${release.id} has no approved version on record`);
    const next = releases[i - 1];
    return {
      release,
      version,
      decision,
      next: next === undefined ? null : { id: next.id, letter: next.letter },
      ref,
    };
  });
}
