import type { Requirement, Specification } from '@tipward/contract';
import { expect, it } from 'vitest';
import { NEW_SPECIFICATION } from './new-specification.ts';
import { specificationChanges } from './specification-changes.ts';

const specification = {
  ...NEW_SPECIFICATION,
  ratedPowerKW: 48,
  tipRadiusM: 7.8,
  hubRadiusM: 0.45,
  minRotorSpeedRpm: 20,
  maxRotorSpeedRpm: 80,
  maxTipSpeedMS: 68,
} as Specification;
const chord: Requirement = { kind: 'max-chord', limit: 0.8, reason: 'mould' };

it('names every field and limit that differs, and nothing else', () => {
  const before = { specification, requirements: [chord] };
  expect(specificationChanges(before, before)).toEqual([]);
  const after = {
    specification: { ...specification, windClass: 'II' as const, meanWindSpeedMS: 8.5, thrustLimitKN: 12 },
    requirements: [
      { ...chord, limit: 0.75 },
      { kind: 'min-cp' as const, limit: 0.45, reason: 'yield' },
    ],
  };
  expect(specificationChanges(before, after)).toEqual([
    { what: 'Wind class', unit: '', before: 'III', after: 'II' },
    { what: 'Mean wind speed', unit: 'm/s', before: '7.5', after: '8.5' },
    { what: 'Thrust limit of the schedule', unit: 'kN', before: '–', after: '12' },
    { what: 'Largest chord', unit: 'm', before: '≤ 0.800', after: '≤ 0.750' },
    { what: 'Smallest maximum CP', unit: '', before: 'none', after: '≥ 0.4500' },
  ]);
});
