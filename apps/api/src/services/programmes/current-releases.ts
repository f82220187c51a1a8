import type { ProgrammeSummary } from '@tipward/contract';
import { QueryTypes } from 'sequelize';
import type { Context } from '../../context.ts';

type CurrentRelease = NonNullable<ProgrammeSummary['currentRelease']>;

const CURRENT = `
  SELECT DISTINCT ON (r.programme_id) r.programme_id AS "programmeId", r.id, r.letter,
    d.name AS "designName", v.number AS "number", r.released_at AS "releasedAt"
  FROM releases r JOIN versions v ON v.id = r.version_id JOIN designs d ON d.id = v.design_id
  WHERE r.programme_id IN (:programmeIds)
  ORDER BY r.programme_id, r.sequence DESC`;

interface Row {
  readonly programmeId: string;
  readonly id: string;
  readonly letter: string;
  readonly designName: string;
  readonly number: number;
  readonly releasedAt: Date;
}

/** The release in force of each programme. */
export async function currentReleases(
  context: Context,
  programmeIds: readonly string[],
): Promise<(programmeId: string) => CurrentRelease | null> {
  if (programmeIds.length === 0) return () => null;
  const rows = await context.db.query<Row>(CURRENT, {
    type: QueryTypes.SELECT,
    replacements: { programmeIds: [...programmeIds] },
  });
  const byId = new Map(rows.map((row) => [row.programmeId, row]));
  return (programmeId) => {
    const row = byId.get(programmeId);
    if (row === undefined) return null;
    const { id, letter, designName, number, releasedAt } = row;
    return { id, letter, designName, versionLabel: `v${number}`, releasedAt: releasedAt.toISOString() };
  };
}
