import type { Requirement, Specification } from '@tipward/contract';

/** Curlew 48, invented: a 48 kW community turbine. */
export const CURLEW: Specification = {
  ratedPowerKW: 48,
  bladeCount: 3,
  tipRadiusM: 7.8,
  hubRadiusM: 0.45,
  coneDeg: 0,
  control: 'variable-speed-pitch',
  minRotorSpeedRpm: 25,
  maxRotorSpeedRpm: 80,
  maxTipSpeedMS: 68,
  minPitchDeg: -2,
  maxPitchDeg: 90,
  drivetrainEfficiency: 0.9,
  airDensityKgM3: 1.225,
  airViscosityPaS: 1.789e-5,
  windClass: 'III',
  meanWindSpeedMS: 7.5,
  weibullShape: 2,
  cutInMS: 3,
  cutOutMS: 22,
  designTipSpeedRatio: 7,
  thrustLimitKN: null,
  lossesPct: 6,
};

/** Largest chord the mould and the van take. */
export const CURLEW_CHORD_CAP_M = 0.8;

/** Share by which the root flapwise moment may pass that of the first sizing. */
const MOMENT_ALLOWANCE = 1.08;

/** Requirements of issue 1; the moment limit follows from the first sizing. */
export function curlewRequirements(firstRootFlapMomentKNm: number): Requirement[] {
  return [
    { kind: 'max-chord', limit: CURLEW_CHORD_CAP_M, reason: 'Mould width and van length' },
    {
      kind: 'max-root-flap-moment',
      limit: Number((firstRootFlapMomentKNm * MOMENT_ALLOWANCE).toFixed(1)),
      reason: 'Hub flange: first sizing plus 8 %',
    },
    { kind: 'max-tip-speed', limit: 68, reason: 'Noise at the nearest house' },
    { kind: 'min-cp', limit: 0.44, reason: 'Offer to the community' },
    { kind: 'min-stall-margin', limit: 2, reason: 'Gusts at rated power' },
  ];
}
