import type { ProgrammeSummary } from '@tipward/contract';
import { QueryTypes } from 'sequelize';
import type { Context } from '../../context.ts';
import type { Actor } from '../../policies/actor.ts';
import { canLead, canSeeWork } from '../../policies/programmes.ts';

type Attention = ProgrammeSummary['attention'];
const NOTHING_WAITS: Attention = {
  reviewsToDecide: 0,
  versionsSentBack: 0,
  openDrafts: 0,
  approvedToRelease: 0,
};

/** A version was sent back as long as its author has not saved a later one from it. */
const COUNTS = `
  SELECT p.id AS "programmeId",
    count(*) FILTER (WHERE s.state = 'in-review' AND s.author_id <> :personId)::int AS "reviewsToDecide",
    count(*) FILTER (WHERE s.state = 'changes-requested' AND s.author_id = :personId
      AND NOT EXISTS (SELECT FROM versions child WHERE child.parent_id = s.version_id))::int AS "versionsSentBack",
    count(*) FILTER (WHERE s.state = 'approved' AND s.author_id <> :personId)::int AS "approvedToRelease",
    (SELECT count(*) FROM drafts f JOIN designs g ON g.id = f.design_id
      WHERE g.programme_id = p.id AND f.author_id = :personId)::int AS "openDrafts"
  FROM programmes p LEFT JOIN version_states s ON s.programme_id = p.id
  WHERE p.id IN (:programmeIds)
  GROUP BY p.id`;

/** What waits for this person in each programme; only what their role lets them do. */
export async function countAttention(
  context: Context,
  actor: Actor,
  programmeIds: readonly string[],
): Promise<(programmeId: string) => Attention> {
  if (programmeIds.length === 0) return () => NOTHING_WAITS;
  const rows = await context.db.query<Attention & { programmeId: string }>(COUNTS, {
    type: QueryTypes.SELECT,
    replacements: { personId: actor.personId, programmeIds: [...programmeIds] },
  });
  const byId = new Map(rows.map(({ programmeId, ...counts }) => [programmeId, counts]));
  return (programmeId) => {
    const counts = byId.get(programmeId);
    if (counts === undefined || !canSeeWork(actor, { programmeId })) return NOTHING_WAITS;
    return canLead(actor, { programmeId }) ? counts : { ...counts, reviewsToDecide: 0, approvedToRelease: 0 };
  };
}
