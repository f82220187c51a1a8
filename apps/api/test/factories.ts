import { createHash, randomUUID } from 'node:crypto';
import { canonicalJson } from '@tipward/design-model';
import {
  DEFAULT_SETTINGS,
  type AirfoilInput,
  type DesignContent,
  type Requirement,
  type Role,
  type Specification,
} from '@tipward/contract';
import { AirfoilRecord } from '../src/models/airfoil-record.ts';
import { Credential } from '../src/models/credential.ts';
import { Design } from '../src/models/design.ts';
import { Membership } from '../src/models/membership.ts';
import { Person } from '../src/models/person.ts';
import { Programme } from '../src/models/programme.ts';
import { SpecificationIssue } from '../src/models/specification-issue.ts';
import { Version } from '../src/models/version.ts';
import { hashPassword } from '../src/services/auth/password.ts';
import type { TestApi } from './test-api.ts';

export const PASSWORD = 'a long enough password';
export const sha256Of = (value: unknown): string =>
  createHash('sha256').update(canonicalJson(value)).digest('hex');

let counter = 0;
const next = (): number => (counter += 1);

export const SPECIFICATION: Specification = {
  ratedPowerKW: 48,
  bladeCount: 3,
  tipRadiusM: 7.8,
  hubRadiusM: 0.45,
  coneDeg: 0,
  control: 'variable-speed-pitch',
  minRotorSpeedRpm: 30,
  maxRotorSpeedRpm: 80,
  maxTipSpeedMS: 68,
  minPitchDeg: -2,
  maxPitchDeg: 90,
  drivetrainEfficiency: 0.9,
  airDensityKgM3: 1.225,
  airViscosityPaS: 1.81e-5,
  windClass: 'III',
  meanWindSpeedMS: 7.5,
  weibullShape: 2,
  cutInMS: 3,
  cutOutMS: 25,
  designTipSpeedRatio: 7,
  thrustLimitKN: null,
  lossesPct: 8,
};

export const REQUIREMENTS: Requirement[] = [{ kind: 'max-chord', limit: 0.8, reason: 'Mould and van' }];

export async function makePerson(
  api: TestApi,
  given: { name?: string; email?: string; isAdministrator?: boolean; withPassword?: boolean } = {},
): Promise<Person> {
  const n = next();
  const person = await Person.create({
    name: given.name ?? `Person ${n}`,
    email: given.email ?? `person-${n}@example.org`,
    isAdministrator: given.isAdministrator ?? false,
  });
  if (given.withPassword !== false)
    await Credential.create({ personId: person.id, passwordHash: await hashPassword(api.context, PASSWORD) });
  return person;
}

/** A programme with issue 1 of its specification and the people given in their roles. */
export async function makeProgramme(
  creator: Person,
  members: readonly (readonly [Person, Role])[] = [],
  name = `Programme ${next()}`,
): Promise<Programme> {
  const programme = await Programme.create({ name, summary: '', createdBy: creator.id });
  await SpecificationIssue.create({
    programmeId: programme.id,
    issue: 1,
    note: 'First issue',
    specification: SPECIFICATION,
    requirements: REQUIREMENTS,
    specificationHash: sha256Of({ specification: SPECIFICATION, requirements: REQUIREMENTS }),
    issuedBy: creator.id,
  });
  for (const [person, role] of members)
    await Membership.create({ programmeId: programme.id, personId: person.id, role });
  return programme;
}

/** Coefficients of a thin plate: cl = 2π sin α cos α below stall, cd small. Smooth and good enough for tests. */
export function airfoilInput(name = `Foil ${next()}`, thicknessPct = 18): AirfoilInput {
  const alphaDeg = Array.from({ length: 73 }, (_, i) => -180 + 5 * i);
  const rad = (deg: number) => (deg * Math.PI) / 180;
  return {
    name,
    thicknessPct,
    note: 'Made for tests',
    outline: [
      [1, 0],
      [0.5, 0.09],
      [0, 0],
      [0.5, -0.09],
      [1, 0],
    ],
    polars: [
      {
        reynolds: 1e6,
        surfaceState: 'clean',
        source: 'Thin-plate formula, made for tests',
        alphaDeg,
        cl: alphaDeg.map((a) => (a === 180 || a === -180 ? 0 : Math.sin(2 * rad(a)) * 1.1)),
        cd: alphaDeg.map((a) => 0.01 + 1.8 * Math.sin(rad(a)) ** 2),
        measuredFromDeg: -10,
        measuredToDeg: 15,
      },
    ],
  };
}

export async function makeAirfoil(adder: Person, input = airfoilInput()): Promise<AirfoilRecord> {
  const { thicknessPct, outline, polars } = input;
  return AirfoilRecord.create({
    ...input,
    polarSetHash: sha256Of({ thicknessPct, outline, polars }),
    addedBy: adder.id,
  });
}

export function designContentWith(airfoils: readonly AirfoilRecord[]): DesignContent {
  return {
    schema: 1,
    specificationIssue: 1,
    pitchDeg: 0,
    designTipSpeedRatio: 7,
    settings: DEFAULT_SETTINGS,
    airfoils: airfoils.map(({ name, id, polarSetHash }) => ({ name, airfoilId: id, polarSetHash })),
    stations: [
      { radiusM: 0.6, chordM: 0.7, twistDeg: 20, thicknessPct: 18, airfoil: null },
      { radiusM: 2, chordM: 0.8, twistDeg: 12, thicknessPct: 18, airfoil: null },
      { radiusM: 5, chordM: 0.5, twistDeg: 4, thicknessPct: 18, airfoil: null },
      { radiusM: 7.6, chordM: 0.25, twistDeg: 0, thicknessPct: 18, airfoil: null },
    ],
  };
}

export async function makeDesign(
  programme: Programme,
  creator: Person,
  name = `Design ${next()}`,
): Promise<Design> {
  return Design.create({ programmeId: programme.id, name, createdBy: creator.id });
}

/** A version written straight into the table, without an evaluation; for tests of the record itself. */
export async function makeBareVersion(design: Design, author: Person, number = 1): Promise<Version> {
  const content = designContentWith([]);
  return Version.create({
    designId: design.id,
    number,
    parentId: null,
    note: `Version ${number}`,
    content,
    contentHash: sha256Of(content),
    specificationIssue: 1,
    specificationHash: sha256Of({ specification: SPECIFICATION, requirements: REQUIREMENTS }),
    solverVersion: '0.0.0-test',
    changeSummary: [],
    authorId: author.id,
  });
}

export const someId = (): string => randomUUID();
