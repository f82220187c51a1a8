import { z } from 'zod';
import { quantity } from '../values/quantity.ts';
import { nameText } from '../values/text.ts';

export const SPECIFICATION_RULES = {
  ratedPowerKW: { label: 'Rated power', unit: 'kW', min: 0, max: 50000, above: true },
  bladeCount: { label: 'Blade count', unit: '', min: 1, max: 12, integer: true },
  tipRadiusM: { label: 'Tip radius', unit: 'm', min: 0, max: 200, above: true },
  hubRadiusM: { label: 'Hub radius', unit: 'm', min: 0, max: 50, above: true },
  coneDeg: { label: 'Cone', unit: '°', min: -10, max: 20 },
  minRotorSpeedRpm: { label: 'Minimum rotor speed', unit: 'rpm', min: 0, max: 3000 },
  maxRotorSpeedRpm: { label: 'Maximum rotor speed', unit: 'rpm', min: 0, max: 3000, above: true },
  maxTipSpeedMS: { label: 'Tip-speed limit', unit: 'm/s', min: 0, max: 150, above: true },
  minPitchDeg: { label: 'Minimum pitch', unit: '°', min: -30, max: 90 },
  maxPitchDeg: { label: 'Maximum pitch', unit: '°', min: -30, max: 95 },
  drivetrainEfficiency: { label: 'Drivetrain efficiency', unit: '', min: 0, max: 1, above: true },
  airDensityKgM3: { label: 'Air density', unit: 'kg/m³', min: 0.3, max: 2 },
  airViscosityPaS: { label: 'Air viscosity', unit: 'Pa·s', min: 1e-6, max: 1e-4 },
  meanWindSpeedMS: { label: 'Mean wind speed', unit: 'm/s', min: 1, max: 25 },
  weibullShape: { label: 'Weibull shape k', unit: '', min: 1, max: 5 },
  cutInMS: { label: 'Cut-in wind speed', unit: 'm/s', min: 0.5, max: 15 },
  cutOutMS: { label: 'Cut-out wind speed', unit: 'm/s', min: 5, max: 60 },
  designTipSpeedRatio: { label: 'Design tip-speed ratio', unit: '', min: 1, max: 20 },
  thrustLimitKN: { label: 'Thrust limit of the schedule', unit: 'kN', min: 0, max: 20000, above: true },
  lossesPct: { label: 'Losses', unit: '%', min: 0, max: 60 },
} as const;

const rules = SPECIFICATION_RULES;

/** The turbine a programme's blades are for. Wind class names the mean speed of IEC 61400-1; 'S' states its own. */
export const specification = z
  .strictObject({
    ratedPowerKW: quantity(rules.ratedPowerKW),
    bladeCount: quantity(rules.bladeCount),
    tipRadiusM: quantity(rules.tipRadiusM),
    hubRadiusM: quantity(rules.hubRadiusM),
    coneDeg: quantity(rules.coneDeg),
    control: z.enum(['variable-speed-pitch', 'fixed-speed-stall']),
    minRotorSpeedRpm: quantity(rules.minRotorSpeedRpm),
    maxRotorSpeedRpm: quantity(rules.maxRotorSpeedRpm),
    maxTipSpeedMS: quantity(rules.maxTipSpeedMS),
    minPitchDeg: quantity(rules.minPitchDeg),
    maxPitchDeg: quantity(rules.maxPitchDeg),
    drivetrainEfficiency: quantity(rules.drivetrainEfficiency),
    airDensityKgM3: quantity(rules.airDensityKgM3),
    airViscosityPaS: quantity(rules.airViscosityPaS),
    windClass: z.enum(['I', 'II', 'III', 'S']),
    meanWindSpeedMS: quantity(rules.meanWindSpeedMS),
    weibullShape: quantity(rules.weibullShape),
    cutInMS: quantity(rules.cutInMS),
    cutOutMS: quantity(rules.cutOutMS),
    designTipSpeedRatio: quantity(rules.designTipSpeedRatio),
    thrustLimitKN: quantity(rules.thrustLimitKN).nullable(),
    lossesPct: quantity(rules.lossesPct),
  })
  .superRefine((spec, context) => {
    const fail = (path: string, message: string) => {
      context.addIssue({ code: 'custom', path: [path], message });
    };
    if (spec.hubRadiusM >= spec.tipRadiusM)
      fail('hubRadiusM', `Hub radius is too large; allowed: below the tip radius, ${spec.tipRadiusM} m`);
    if (spec.minRotorSpeedRpm > spec.maxRotorSpeedRpm)
      fail(
        'minRotorSpeedRpm',
        `Minimum rotor speed is too high; allowed: at most the maximum, ${spec.maxRotorSpeedRpm} rpm`,
      );
    if (spec.minPitchDeg >= spec.maxPitchDeg)
      fail('minPitchDeg', `Minimum pitch is too high; allowed: below the maximum, ${spec.maxPitchDeg}°`);
    if (spec.cutInMS >= spec.cutOutMS)
      fail('cutInMS', `Cut-in is too high; allowed: below cut-out, ${spec.cutOutMS} m/s`);
    const classMean = { I: 10, II: 8.5, III: 7.5, S: null }[spec.windClass];
    if (classMean !== null && spec.meanWindSpeedMS !== classMean)
      fail(
        'meanWindSpeedMS',
        `Mean wind speed does not fit class ${spec.windClass}; allowed: ${classMean} m/s, or class S`,
      );
  });
export type Specification = z.infer<typeof specification>;

/** Kinds of requirement: how a limit reads, its unit, and whether it is an upper or a lower one. */
export const REQUIREMENT_KINDS = {
  'max-chord': { label: 'Largest chord', unit: 'm', bound: 'upper' },
  'max-thrust': { label: 'Largest rotor thrust', unit: 'kN', bound: 'upper' },
  'max-root-flap-moment': { label: 'Largest root flapwise moment', unit: 'kN·m', bound: 'upper' },
  'max-root-edge-moment': { label: 'Largest root edgewise moment', unit: 'kN·m', bound: 'upper' },
  'max-tip-speed': { label: 'Largest tip speed', unit: 'm/s', bound: 'upper' },
  'min-cp': { label: 'Smallest maximum CP', unit: '', bound: 'lower' },
  'min-energy': { label: 'Smallest annual energy (net)', unit: 'MWh', bound: 'lower' },
  'min-stall-margin': { label: 'Smallest stall margin', unit: '°', bound: 'lower' },
  'max-chord-curvature': { label: 'Chord roughness (second difference)', unit: '% R', bound: 'upper' },
  'max-twist-curvature': { label: 'Twist roughness (second difference)', unit: '°', bound: 'upper' },
} as const;
export type RequirementKind = keyof typeof REQUIREMENT_KINDS;
const kinds = Object.keys(REQUIREMENT_KINDS) as [RequirementKind, ...RequirementKind[]];

export const requirement = z.strictObject({
  kind: z.enum(kinds),
  limit: quantity({ label: 'Limit', unit: '', min: 0, max: 1e7 }),
  reason: nameText('Reason', 200),
});
export type Requirement = z.infer<typeof requirement>;

export const requirements = z
  .array(requirement)
  .max(40, 'Too many requirements; allowed: at most 40')
  .superRefine((list, context) => {
    list.forEach((entry, i) => {
      if (list.findIndex((other) => other.kind === entry.kind) !== i)
        context.addIssue({
          code: 'custom',
          path: [i, 'kind'],
          message: 'Requirement stands twice; allowed: one limit of a kind',
        });
    });
  });
