import type { Requirement, Specification } from '@tipward/contract';

/** Bittern 3200, invented: a 3.2 MW turbine with a thrust-limited schedule. */
export const BITTERN: Specification = {
  ratedPowerKW: 3200,
  bladeCount: 3,
  tipRadiusM: 63,
  hubRadiusM: 1.6,
  coneDeg: 0,
  control: 'variable-speed-pitch',
  minRotorSpeedRpm: 5,
  maxRotorSpeedRpm: 12.4,
  maxTipSpeedMS: 82,
  minPitchDeg: -2,
  maxPitchDeg: 90,
  drivetrainEfficiency: 0.93,
  airDensityKgM3: 1.225,
  airViscosityPaS: 1.789e-5,
  windClass: 'II',
  meanWindSpeedMS: 8.5,
  weibullShape: 2,
  cutInMS: 3,
  cutOutMS: 25,
  designTipSpeedRatio: 8.5,
  thrustLimitKN: 430,
  lossesPct: 8,
};

export const BITTERN_REQUIREMENTS: Requirement[] = [
  { kind: 'max-chord', limit: 4.2, reason: 'Road transport' },
  { kind: 'max-thrust', limit: 430, reason: 'Tower and foundation' },
  { kind: 'max-tip-speed', limit: 82, reason: 'Noise and leading-edge wear' },
  { kind: 'min-cp', limit: 0.47, reason: 'Offer' },
  { kind: 'min-stall-margin', limit: 2.5, reason: 'Turbulent inflow' },
];
