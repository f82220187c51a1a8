import { annualEnergy, operatingSchedule, SOLVER } from '@tipward/bem-solver';
import type { ScheduleSpec } from '@tipward/bem-solver';
import type {
  DesignContent,
  Evaluation,
  KeyNumbers,
  OperatingPoint,
  Requirement,
  Specification,
} from '@tipward/contract';
import type { AirfoilData } from '../airfoil-data.ts';
import type { LiveResult } from './live-result.ts';
import { prepareRotor } from './rotor-input.ts';
import { solveLive } from './solve-live.ts';
import { smallestStallMargin } from './stall-margin.ts';
import { judge } from './verdicts.ts';

export interface EvaluationInput {
  readonly content: DesignContent;
  readonly contentHash: string;
  readonly specification: Specification;
  readonly specificationHash: string;
  readonly requirements: readonly Requirement[];
  readonly airfoils: readonly AirfoilData[];
}

const WIND_STEP_MS = 0.5;

/** Wind speeds of the schedule: cut-in to cut-out in steps of 0.5 m/s, cut-out included. */
function scheduleSpeeds(spec: Specification): number[] {
  const count = Math.floor((spec.cutOutMS - spec.cutInMS) / WIND_STEP_MS + 1e-9);
  const speeds = Array.from({ length: count + 1 }, (_, i) =>
    Number((spec.cutInMS + i * WIND_STEP_MS).toFixed(6)),
  );
  if ((speeds.at(-1) ?? 0) < spec.cutOutMS - 1e-9) speeds.push(spec.cutOutMS);
  return speeds;
}

function scheduleSpec(spec: Specification, content: DesignContent, live: LiveResult): ScheduleSpec {
  return {
    control: spec.control,
    optimumTipSpeedRatio: live.tipSpeedRatioAtMaxCp ?? content.designTipSpeedRatio,
    finePitchDeg: content.pitchDeg,
    minRotorSpeedRadS: (spec.minRotorSpeedRpm * Math.PI) / 30,
    maxRotorSpeedRadS: (spec.maxRotorSpeedRpm * Math.PI) / 30,
    maxTipSpeedMS: spec.maxTipSpeedMS,
    ratedPowerW: spec.ratedPowerKW * 1000,
    drivetrainEfficiency: spec.drivetrainEfficiency,
    minPitchDeg: spec.minPitchDeg,
    maxPitchDeg: spec.maxPitchDeg,
    thrustLimitN: spec.thrustLimitKN === null ? null : spec.thrustLimitKN * 1000,
  };
}

const kilo = (value: number | null) => (value === null ? null : value / 1000);

function largest(
  points: readonly OperatingPoint[],
  pick: (point: OperatingPoint) => number | null,
): number | null {
  const values = points.flatMap((point) => pick(point) ?? []);
  return values.length === 0 ? null : Math.max(...values);
}

/** Trapezoid over the stations with the chord held to hub and tip radius. */
function planformArea(content: DesignContent, spec: Specification): number {
  const inside = content.stations.map((s) => [s.radiusM, s.chordM] as const);
  const points = [
    [spec.hubRadiusM, inside[0]?.[1] ?? 0] as const,
    ...inside,
    [spec.tipRadiusM, inside.at(-1)?.[1] ?? 0] as const,
  ];
  return points.slice(1).reduce((sum, [r, c], i) => {
    const [r0, c0] = points[i] ?? [r, c];
    return sum + Math.max(0, r - r0) * 0.5 * (c + c0);
  }, 0);
}

/**
 * Everything the product says of one content under one specification: curve, spanwise state, operating schedule,
 * energy, verdicts and warnings. Reproducible bit for bit on one engine from its arguments.
 */
export function evaluateContent(input: EvaluationInput): Evaluation {
  const { content, specification: spec, requirements, airfoils } = input;
  const prepared = prepareRotor(content, spec, airfoils);
  const live = solveLive({ content, specification: spec, airfoils, tipSpeedRatio: null });
  const operation = operatingSchedule(
    prepared.rotor,
    scheduleSpec(spec, content, live),
    scheduleSpeeds(spec),
  );
  const schedule = operation.points.map((p): OperatingPoint => ({
    windSpeedMS: p.windSpeedMS,
    rotorSpeedRpm: (p.rotorSpeedRadS * 30) / Math.PI,
    pitchDeg: p.pitchDeg,
    tipSpeedRatio: (p.rotorSpeedRadS * spec.tipRadiusM) / p.windSpeedMS,
    governedBy: p.governedBy,
    status: p.status,
    cp: p.cp,
    ct: p.ct,
    powerKW: kilo(p.powerW),
    electricalPowerKW: kilo(p.electricalPowerW),
    thrustKN: kilo(p.thrustN),
    rootFlapMomentKNm: kilo(p.rootFlapMomentNm),
    rootEdgeMomentKNm: kilo(p.rootEdgeMomentNm),
  }));
  const energy = annualEnergyMWh(schedule, spec);
  const margin = smallestStallMargin(content, live.span);
  const area = planformArea(content, spec);
  const keyNumbers: KeyNumbers = {
    maxCp: live.maxCp,
    tipSpeedRatioAtMaxCp: live.tipSpeedRatioAtMaxCp,
    ctAtMaxCp: live.ctAtMaxCp,
    energyGrossMWh: energy,
    energyNetMWh: energy === null ? null : energy * (1 - spec.lossesPct / 100),
    capacityFactor: energy === null ? null : energy / (spec.ratedPowerKW * 8.76),
    ratedWindSpeedMS: operation.ratedWindSpeedMS,
    maxThrustKN: largest(schedule, (p) => p.thrustKN),
    maxRootFlapMomentKNm: largest(schedule, (p) => p.rootFlapMomentKNm),
    maxRootEdgeMomentKNm: largest(schedule, (p) => p.rootEdgeMomentKNm),
    maxTipSpeedMS: largest(schedule, (p) => (p.rotorSpeedRpm * Math.PI * spec.tipRadiusM) / 30),
    maxChordM: Math.max(...content.stations.map((s) => s.chordM)),
    solidity: (spec.bladeCount * area) / (Math.PI * spec.tipRadiusM ** 2),
    planformAreaM2: area,
    minStallMarginDeg: margin?.value ?? null,
  };
  return {
    solver: { ...SOLVER },
    contentHash: input.contentHash,
    specificationHash: input.specificationHash,
    curve: live.curve,
    span: live.span,
    schedule,
    keyNumbers,
    verdicts: judge(requirements, {
      content,
      specification: spec,
      keyNumbers,
      schedule,
      stallMargin: margin,
    }),
    warnings: [
      ...live.warnings,
      ...schedule
        .filter((p) => p.status !== 'converged')
        .slice(0, 1)
        .map((p) => ({
          code: 'schedule-unsolved',
          message: `No complete solution at ${p.windSpeedMS} m/s (${p.status}); energy leaves it out`,
          station: null,
        })),
    ],
  };
}

function annualEnergyMWh(schedule: readonly OperatingPoint[], spec: Specification): number | null {
  const curve = schedule.flatMap((p) =>
    p.electricalPowerKW === null
      ? []
      : [{ windSpeedMS: p.windSpeedMS, powerW: 1000 * Math.max(0, p.electricalPowerKW) }],
  );
  if (curve.length < 2) return null;
  const wind =
    spec.windClass === 'S' && spec.weibullShape !== 2
      ? ({ kind: 'weibull', meanMS: spec.meanWindSpeedMS, shape: spec.weibullShape } as const)
      : ({ kind: 'rayleigh', meanMS: spec.meanWindSpeedMS } as const);
  return annualEnergy(curve, wind).energyWh / 1e6;
}
