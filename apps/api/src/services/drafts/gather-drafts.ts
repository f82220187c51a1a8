import type { Transaction, WhereOptions } from 'sequelize';
import { Design } from '../../models/design.ts';
import { Draft } from '../../models/draft.ts';
import { Programme } from '../../models/programme.ts';
import { Version } from '../../models/version.ts';
import type { DraftParts } from '../../presenters/draft.ts';

/** Drafts that fit, latest first, each with the names around it. */
export async function gatherDrafts(
  where: WhereOptions<Draft>,
  transaction?: Transaction,
): Promise<DraftParts[]> {
  const options = transaction === undefined ? {} : { transaction };
  const drafts = await Draft.findAll({ where, order: [['updatedAt', 'DESC']], ...options });
  if (drafts.length === 0) return [];
  const designs = await Design.findAll({ where: { id: drafts.map((draft) => draft.designId) }, ...options });
  const parents = await Version.findAll({
    where: { id: drafts.flatMap((draft) => draft.parentVersionId ?? []) },
    attributes: ['id', 'number'],
    ...options,
  });
  const programmes = await Programme.findAll({
    where: { id: designs.map((design) => design.programmeId) },
    ...options,
  });
  return drafts.map((draft) => {
    const design = designs.find((row) => row.id === draft.designId);
    const programme = programmes.find((row) => row.id === design?.programmeId);
    if (design === undefined || programme === undefined)
      throw new Error(`draft ${draft.id} has no design on record`);
    return {
      draft,
      designName: design.name,
      programmeId: programme.id,
      programmeName: programme.name,
      parentNumber: parents.find((row) => row.id === draft.parentVersionId)?.number ?? null,
    };
  });
}
