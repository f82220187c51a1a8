import type { WhereOptions } from 'sequelize';
import { Design } from '../../models/design.ts';
import type { DesignParts } from '../../presenters/design.ts';
import { presentVersionSummary } from '../../presenters/version.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';
import { gatherVersions } from '../versions/gather-versions.ts';

/** Designs that fit, latest first, each with its versions. */
export async function gatherDesigns(where: WhereOptions<Design>): Promise<DesignParts[]> {
  const designs = await Design.findAll({ where, order: [['updatedAt', 'DESC']] });
  const [versions, ref] = await Promise.all([
    gatherVersions({ designId: designs.map((design) => design.id) }),
    loadPersonRefs(designs.map((design) => design.createdBy)),
  ]);
  return designs.map((design) => ({
    design,
    createdBy: ref(design.createdBy),
    versions: versions
      .filter((parts) => parts.version.designId === design.id)
      .sort((a, b) => b.version.number - a.version.number)
      .map(presentVersionSummary),
  }));
}
