import type { DesignContent, Fault } from '@tipward/contract';
import type { Transaction } from 'sequelize';
import { invalid } from '../../http/app-error.ts';
import { AirfoilRecord } from '../../models/airfoil-record.ts';
import { SpecificationIssue } from '../../models/specification-issue.ts';

export interface DesignInputs {
  readonly issue: SpecificationIssue;
  readonly airfoils: readonly AirfoilRecord[];
}

function pinFaults(content: DesignContent, records: readonly AirfoilRecord[]): Fault[] {
  return content.airfoils.flatMap((pin, i): Fault[] => {
    const record = records.find((row) => row.id === pin.airfoilId);
    if (record === undefined)
      return [
        {
          field: `airfoils[${i}].airfoilId`,
          value: pin.airfoilId,
          message: 'Airfoil is not in the library; allowed: one of the library',
        },
      ];
    if (record.polarSetHash !== pin.polarSetHash)
      return [
        {
          field: `airfoils[${i}].polarSetHash`,
          value: pin.polarSetHash,
          message: `Polars of ${record.name} have another hash; allowed: ${record.polarSetHash}`,
        },
      ];
    return [];
  });
}

/**
 * The specification issue and the airfoils a content names.
 * @throws AppError `invalid` with every fault: an issue or airfoil that does not exist, a hash that does not fit, no airfoil
 */
export async function loadInputs(
  programmeId: string,
  content: DesignContent,
  transaction?: Transaction,
): Promise<DesignInputs> {
  const options = transaction === undefined ? {} : { transaction };
  const [issue, records] = await Promise.all([
    SpecificationIssue.findOne({ where: { programmeId, issue: content.specificationIssue }, ...options }),
    AirfoilRecord.findAll({ where: { id: content.airfoils.map((pin) => pin.airfoilId) }, ...options }),
  ]);
  const faults = pinFaults(content, records);
  if (content.airfoils.length === 0)
    faults.push({ field: 'airfoils', value: 'none', message: 'No airfoil; allowed: 1 to 24' });
  if (issue === null)
    faults.push({
      field: 'specificationIssue',
      value: String(content.specificationIssue),
      message: 'Specification issue does not exist; allowed: an issue of the programme',
    });
  if (issue !== null) faults.push(...spanFaults(content, issue));
  if (issue === null || faults.length > 0) throw invalid(faults);
  // The names in the content are what stations refer to.
  const airfoils = content.airfoils.flatMap((pin) => records.filter((row) => row.id === pin.airfoilId));
  return { issue, airfoils };
}

/** Stations must lie on the blade of the specification. */
function spanFaults(content: DesignContent, issue: SpecificationIssue): Fault[] {
  const { hubRadiusM, tipRadiusM } = issue.specification;
  return content.stations.flatMap((station, i): Fault[] =>
    station.radiusM >= hubRadiusM && station.radiusM <= tipRadiusM
      ? []
      : [
          {
            field: `stations[${i}].radiusM`,
            value: String(station.radiusM),
            message: `Radius lies outside the blade; allowed: ${hubRadiusM} to ${tipRadiusM} m`,
          },
        ],
  );
}
