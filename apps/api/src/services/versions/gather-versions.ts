import { Op, type Transaction, type WhereOptions } from 'sequelize';
import { Design } from '../../models/design.ts';
import { EvaluationRecord } from '../../models/evaluation-record.ts';
import { Programme } from '../../models/programme.ts';
import { Version } from '../../models/version.ts';
import { VersionState } from '../../models/version-state.ts';
import type { VersionParts } from '../../presenters/version.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';

const byId = <T extends { id: string }>(rows: readonly T[]) => new Map(rows.map((row) => [row.id, row]));

function found<T>(value: T | undefined, what: string): T {
  if (value === undefined) throw new Error(`${what} of a version is missing from the record`);
  return value;
}

/** Versions that fit, newest first, each with its state, evaluation, design, parent and author. */
export async function gatherVersions(
  where: WhereOptions<Version>,
  transaction?: Transaction,
): Promise<VersionParts[]> {
  const options = transaction === undefined ? {} : { transaction };
  const versions = await Version.findAll({
    where,
    order: [
      ['savedAt', 'DESC'],
      ['number', 'DESC'],
    ],
    ...options,
  });
  if (versions.length === 0) return [];
  const parentIds = versions.flatMap((version) => version.parentId ?? []);
  // One after the other: a transaction has one connection.
  const states = await VersionState.findAll({
    where: { versionId: versions.map((version) => version.id) },
    ...options,
  });
  const evaluations = await EvaluationRecord.findAll({
    where: { contentHash: { [Op.in]: versions.map((version) => version.contentHash) } },
    ...options,
  });
  const designs = await Design.findAll({
    where: { id: versions.map((version) => version.designId) },
    ...options,
  });
  const parents = await Version.findAll({
    where: { id: parentIds },
    attributes: ['id', 'number'],
    ...options,
  });
  const ref = await loadPersonRefs(versions.map((version) => version.authorId));
  const programmes = await Programme.findAll({
    where: { id: designs.map((design) => design.programmeId) },
    ...options,
  });
  const stateOf = new Map(states.map((state) => [state.versionId, state]));
  const key = (row: { contentHash: string; specificationHash: string; solverVersion: string }) =>
    `${row.contentHash} ${row.specificationHash} ${row.solverVersion}`;
  const evaluationOf = new Map(evaluations.map((row) => [key(row), row.evaluation]));
  const [designOf, programmeOf, parentOf] = [byId(designs), byId(programmes), byId(parents)];
  return versions.map((version) => {
    const design = found(designOf.get(version.designId), 'the design');
    return {
      version,
      state: found(stateOf.get(version.id), 'the state'),
      evaluation: found(evaluationOf.get(key(version)), 'the evaluation'),
      designName: design.name,
      programmeId: design.programmeId,
      programmeName: found(programmeOf.get(design.programmeId), 'the programme').name,
      parentNumber:
        version.parentId === null ? null : found(parentOf.get(version.parentId), 'the parent').number,
      author: ref(version.authorId),
    };
  });
}
