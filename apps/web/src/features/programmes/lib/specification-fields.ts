import { SPECIFICATION_RULES } from '@tipward/contract';
import type { Specification } from '@tipward/contract';

export type NumberField = keyof typeof SPECIFICATION_RULES;

export interface FieldGroup {
  readonly title: string;
  readonly fields: readonly NumberField[];
}

/** The numbers of a specification in the order in which an engineer asks for them. */
export const FIELD_GROUPS: readonly FieldGroup[] = [
  {
    title: 'Rotor',
    fields: ['ratedPowerKW', 'bladeCount', 'tipRadiusM', 'hubRadiusM', 'coneDeg', 'designTipSpeedRatio'],
  },
  {
    title: 'Control',
    fields: [
      'minRotorSpeedRpm',
      'maxRotorSpeedRpm',
      'maxTipSpeedMS',
      'minPitchDeg',
      'maxPitchDeg',
      'thrustLimitKN',
    ],
  },
  { title: 'Losses', fields: ['drivetrainEfficiency', 'lossesPct'] },
  { title: 'Wind', fields: ['meanWindSpeedMS', 'weibullShape', 'cutInMS', 'cutOutMS'] },
  { title: 'Air', fields: ['airDensityKgM3', 'airViscosityPaS'] },
];

/** Fields that may stay empty, and what empty means. */
export const OPTIONAL_FIELDS: Partial<Record<NumberField, string>> = {
  thrustLimitKN: 'Empty: the schedule is not held to a thrust.',
};

export const CONTROL_WORDS: Record<Specification['control'], string> = {
  'variable-speed-pitch': 'variable speed with pitch',
  'fixed-speed-stall': 'fixed speed, stall-regulated',
};

/** Mean wind speed at hub height of the classes of IEC 61400-1: 0.2 of the reference speed, 50, 42.5 and 37.5 m/s. */
export const CLASS_MEAN_MS: Record<Specification['windClass'], number | null> = {
  I: 10,
  II: 8.5,
  III: 7.5,
  S: null,
};

export const WIND_CLASSES: readonly { value: Specification['windClass']; label: string }[] = [
  { value: 'I', label: 'I, 10 m/s' },
  { value: 'II', label: 'II, 8.5 m/s' },
  { value: 'III', label: 'III, 7.5 m/s' },
  { value: 'S', label: 'S, own mean' },
];

/** A value as it is shown and edited: as precise as it was given, a true minus, an en dash for none. */
export const shownNumber = (value: number | null): string =>
  value === null ? '–' : String(value).replace('-', '−');
