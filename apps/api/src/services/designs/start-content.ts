import type { DesignStart, DraftContent } from '@tipward/contract';
import { DEFAULT_SETTINGS } from '@tipward/contract';
import { sizeFromSpecification, toDraft } from '@tipward/design-model';
import { invalid } from '../../http/app-error.ts';
import { AirfoilRecord } from '../../models/airfoil-record.ts';
import { SpecificationIssue } from '../../models/specification-issue.ts';
import type { Actor } from '../../policies/actor.ts';
import { findVersion } from '../versions/find-version.ts';

export interface StartedContent {
  readonly content: DraftContent;
  readonly parentVersionId: string | null;
}

async function findAirfoils(ids: readonly string[]): Promise<AirfoilRecord[]> {
  const rows = await AirfoilRecord.findAll({ where: { id: [...ids] } });
  return ids.map((id, i) => {
    const row = rows.find((record) => record.id === id);
    if (row === undefined)
      throw invalid([
        {
          field: `start.airfoilIds[${i}]`,
          value: id,
          message: 'Airfoil is not in the library; allowed: one of the library',
        },
      ]);
    return row;
  });
}

function sized(
  start: Extract<DesignStart, { kind: 'sized' }>,
  issue: SpecificationIssue,
  airfoils: readonly AirfoilRecord[],
) {
  try {
    return sizeFromSpecification({
      specification: issue.specification,
      airfoils,
      tipSpeedRatio: start.tipSpeedRatio,
      designLift: start.designLift,
      maxChordM: start.maxChordM,
      stationCount: start.stationCount,
    });
  } catch (error) {
    // What the sizing says of its arguments is meant for whoever gave them.
    if (error instanceof RangeError)
      throw invalid([{ field: 'start.designLift', value: String(start.designLift), message: error.message }]);
    throw error;
  }
}

/** The content a new design begins with: sized from the latest specification, as given, or as it stands in a version. */
export async function startContent(
  actor: Actor,
  programmeId: string,
  start: DesignStart,
): Promise<StartedContent> {
  if (start.kind === 'fork') {
    const { version, programmeId: from } = await findVersion(actor, start.versionId);
    if (from !== programmeId)
      throw invalid([
        {
          field: 'start.versionId',
          value: start.versionId,
          message: 'Version is of another programme; allowed: one of this programme',
        },
      ]);
    return { content: toDraft(version.content), parentVersionId: version.id };
  }
  const issue = await SpecificationIssue.findOne({ where: { programmeId }, order: [['issue', 'DESC']] });
  if (issue === null) throw new Error(`programme ${programmeId} has no specification`);
  const airfoils = await findAirfoils(start.airfoilIds);
  const base = {
    schema: 1 as const,
    specificationIssue: issue.issue,
    pitchDeg: 0,
    designTipSpeedRatio: issue.specification.designTipSpeedRatio,
    settings: DEFAULT_SETTINGS,
    airfoils: airfoils.map((row) => ({ name: row.name, airfoilId: row.id, polarSetHash: row.polarSetHash })),
  };
  if (start.kind === 'stations')
    return { content: { ...base, stations: start.stations }, parentVersionId: null };
  const blade = sized(start, issue, airfoils);
  return {
    content: {
      ...base,
      designTipSpeedRatio: start.tipSpeedRatio,
      pitchDeg: blade.pitchDeg,
      stations: blade.stations,
    },
    parentVersionId: null,
  };
}
