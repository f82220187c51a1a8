import type { DesignContent, Evaluation, PersonRef } from '@tipward/contract';
import { CAUTION, canonicalJson, curveCsv, scheduleCsv, stationsCsv } from '@tipward/design-model';

/** What a release package is made of; everything comes from the record. */
export interface PackageSource {
  readonly programmeName: string;
  readonly designName: string;
  readonly versionLabel: string;
  readonly letter: string;
  readonly effectivity: string;
  readonly note: string;
  readonly content: DesignContent;
  readonly contentHash: string;
  readonly specificationHash: string;
  readonly evaluation: Evaluation;
  readonly approvedBy: PersonRef;
  readonly approvedAt: string;
  readonly releasedBy: PersonRef;
  readonly releasedAt: string;
}

export interface PackageFile {
  readonly name: string;
  readonly bytes: Buffer;
}

const text = (name: string, body: string): PackageFile => ({ name, bytes: Buffer.from(body, 'utf8') });
const json = (name: string, value: unknown): PackageFile =>
  text(name, `${JSON.stringify(JSON.parse(canonicalJson(value)), null, 2)}\n`);

function readme(source: PackageSource): string {
  return `Release ${source.letter} of ${source.programmeName}: ${source.designName} ${source.versionLabel}

Effectivity: ${source.effectivity}
${source.note === '' ? '' : `Note: ${source.note}\n`}Approved by ${source.approvedBy.name}, ${source.approvedAt}
Released by ${source.releasedBy.name}, ${source.releasedAt}

CAUTION. ${CAUTION}

stations.csv   blade stations: radius and chord in m, twist in degrees (positive toward feather), relative thickness in %
curve.csv      CP and CT against tip-speed ratio at the design's pitch
schedule.csv   operating schedule with power, thrust and root moments against wind speed (steady)
design.json    the released design as it is on record; its content hash is in release.json
release.json   who approved and released what, with hashes and key numbers
manifest.json  SHA-256 and size of every file

To prove the package: npm run verify-release FILE.zip
`;
}

function record(source: PackageSource): unknown {
  const { content: _content, evaluation, ...rest } = source;
  return {
    ...rest,
    solver: evaluation.solver,
    keyNumbers: evaluation.keyNumbers,
    verdicts: evaluation.verdicts,
    warnings: evaluation.warnings,
    caution: CAUTION,
  };
}

/** The files of a package in their fixed order, without the manifest. */
export function releaseFiles(source: PackageSource): PackageFile[] {
  return [
    text('README.txt', readme(source)),
    text('stations.csv', stationsCsv(source.content)),
    text('curve.csv', curveCsv(source.evaluation)),
    text('schedule.csv', scheduleCsv(source.evaluation)),
    json('design.json', source.content),
    json('release.json', record(source)),
  ];
}
