import { REQUIREMENT_KINDS } from '@tipward/contract';
import type {
  DesignContent,
  KeyNumbers,
  OperatingPoint,
  Requirement,
  RequirementKind,
  Specification,
  Verdict,
} from '@tipward/contract';
import { chordRoughnessPct, twistRoughnessDeg } from './roughness.ts';

export interface JudgedResult {
  readonly content: DesignContent;
  readonly specification: Specification;
  readonly keyNumbers: KeyNumbers;
  readonly schedule: readonly OperatingPoint[];
  readonly stallMargin: { value: number; radiusM: number } | null;
}

interface Measured {
  readonly value: number | null;
  readonly at: Verdict['at'];
}

function atWind(result: JudgedResult, pick: (point: OperatingPoint) => number | null): Measured {
  let best: Measured = { value: null, at: null };
  for (const point of result.schedule) {
    const value = pick(point);
    if (value !== null && (best.value === null || value > best.value))
      best = { value, at: { quantity: 'wind-speed', value: point.windSpeedMS } };
  }
  return best;
}

function atStation(result: JudgedResult, value: number, station: number | null): Measured {
  const radius = station === null ? undefined : result.content.stations[station]?.radiusM;
  return { value, at: radius === undefined ? null : { quantity: 'radius', value: radius } };
}

const MEASURES: Record<RequirementKind, (result: JudgedResult) => Measured> = {
  'max-chord': (r) => {
    const chords = r.content.stations.map((s) => s.chordM);
    const value = Math.max(...chords);
    return atStation(r, value, chords.indexOf(value));
  },
  'max-thrust': (r) => atWind(r, (p) => p.thrustKN),
  'max-root-flap-moment': (r) => atWind(r, (p) => p.rootFlapMomentKNm),
  'max-root-edge-moment': (r) => atWind(r, (p) => p.rootEdgeMomentKNm),
  'max-tip-speed': (r) => atWind(r, (p) => (p.rotorSpeedRpm * Math.PI * r.specification.tipRadiusM) / 30),
  'min-cp': (r) => ({
    value: r.keyNumbers.maxCp,
    at:
      r.keyNumbers.tipSpeedRatioAtMaxCp === null
        ? null
        : { quantity: 'tip-speed-ratio', value: r.keyNumbers.tipSpeedRatioAtMaxCp },
  }),
  'min-energy': (r) => ({ value: r.keyNumbers.energyNetMWh, at: null }),
  'min-stall-margin': (r) => ({
    value: r.stallMargin?.value ?? null,
    at: r.stallMargin === null ? null : { quantity: 'radius', value: r.stallMargin.radiusM },
  }),
  'max-chord-curvature': (r) => {
    const rough = chordRoughnessPct(r.content.stations, r.specification.tipRadiusM);
    return atStation(r, rough.value, rough.station);
  },
  'max-twist-curvature': (r) => {
    const rough = twistRoughnessDeg(r.content.stations);
    return atStation(r, rough.value, rough.station);
  },
};

/** Rounding of a solved figure must not turn a limit that is met exactly into a failure. */
const RELATIVE_SLACK = 1e-9;

/** Holds each requirement against a result: value, margin (positive where it holds), and where it governs. */
export function judge(requirements: readonly Requirement[], result: JudgedResult): Verdict[] {
  return requirements.map(({ kind, limit, reason }) => {
    const { label, unit, bound } = REQUIREMENT_KINDS[kind];
    const { value, at } = MEASURES[kind](result);
    const margin = value === null ? null : bound === 'upper' ? limit - value : value - limit;
    const verdict =
      margin === null
        ? 'unknown'
        : margin >= -RELATIVE_SLACK * Math.max(1, Math.abs(limit))
          ? 'holds'
          : 'fails';
    return { kind, label, unit, bound, limit, value, margin, verdict, at, reason };
  });
}
