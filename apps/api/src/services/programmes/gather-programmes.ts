import type { Context } from '../../context.ts';
import { SpecificationIssue } from '../../models/specification-issue.ts';
import type { Programme } from '../../models/programme.ts';
import type { Actor } from '../../policies/actor.ts';
import type { ProgrammeParts } from '../../presenters/programme.ts';
import { countAttention } from './count-attention.ts';
import { currentReleases } from './current-releases.ts';

async function latestIssues(programmeIds: readonly string[]): Promise<Map<string, SpecificationIssue>> {
  const issues = await SpecificationIssue.findAll({
    where: { programmeId: [...programmeIds] },
    order: [['issue', 'ASC']],
  });
  return new Map(issues.map((issue) => [issue.programmeId, issue]));
}

/** Programmes with all that a summary shows: latest issue, release in force, what waits for the actor. */
export async function gatherProgrammes(
  context: Context,
  actor: Actor,
  programmes: readonly Programme[],
): Promise<ProgrammeParts[]> {
  const ids = programmes.map(({ id }) => id);
  const [issues, releases, attention] = await Promise.all([
    latestIssues(ids),
    currentReleases(context, ids),
    countAttention(context, actor, ids),
  ]);
  return programmes.map((programme) => {
    const latest = issues.get(programme.id);
    if (latest === undefined) throw new Error(`programme ${programme.id} has no specification`);
    return { programme, latest, currentRelease: releases(programme.id), attention: attention(programme.id) };
  });
}
