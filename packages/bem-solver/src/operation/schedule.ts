import { requireNumber } from '../input-error.ts';
import { brent } from '../numerics/root.ts';
import type { Rotor } from '../rotor/rotor.ts';
import type { PointResult, PointStatus } from '../rotor/solve-point.ts';
import { solvePoint } from '../rotor/solve-point.ts';

export interface ScheduleSpec {
  readonly control: 'variable-speed-pitch' | 'fixed-speed-stall';
  readonly optimumTipSpeedRatio: number;
  readonly finePitchDeg: number;
  readonly minRotorSpeedRadS: number;
  readonly maxRotorSpeedRadS: number;
  readonly maxTipSpeedMS: number;
  /** Electrical power at which the rotor is held (W). */
  readonly ratedPowerW: number;
  readonly drivetrainEfficiency: number;
  readonly minPitchDeg: number;
  readonly maxPitchDeg: number;
  /** Rotor thrust that pitch must not let be passed (N), or null. */
  readonly thrustLimitN: number | null;
}

/** What holds the rotor where it is at a wind speed. */
export type Governor =
  | 'optimum'
  | 'minimum-speed'
  | 'maximum-speed'
  | 'rated-power'
  | 'thrust-limit'
  | 'pitch-limit'
  | 'fixed-speed';

export interface SchedulePoint {
  readonly windSpeedMS: number;
  readonly rotorSpeedRadS: number;
  readonly pitchDeg: number;
  readonly governedBy: Governor;
  readonly status: PointStatus;
  readonly cp: number | null;
  readonly ct: number | null;
  readonly powerW: number | null;
  /** 0 where the rotor would have to be driven. */
  readonly electricalPowerW: number | null;
  readonly thrustN: number | null;
  readonly rootFlapMomentNm: number | null;
  readonly rootEdgeMomentNm: number | null;
}

export interface ScheduleResult {
  readonly points: readonly SchedulePoint[];
  /** Wind speed at which rated power is first reached (m/s); null where it is not. */
  readonly ratedWindSpeedMS: number | null;
}

const PITCH_STEP_DEG = 3;
const PITCH_TOLERANCE_DEG = 1e-10;

interface Held {
  readonly point: PointResult;
  readonly governedBy: Governor;
}

function rotorSpeed(
  spec: ScheduleSpec,
  tipRadiusM: number,
  wind: number,
): { omega: number; governedBy: Governor } {
  const top = Math.min(spec.maxRotorSpeedRadS, spec.maxTipSpeedMS / tipRadiusM);
  if (spec.control === 'fixed-speed-stall') return { omega: top, governedBy: 'fixed-speed' };
  const best = (spec.optimumTipSpeedRatio * wind) / tipRadiusM;
  if (best > top) return { omega: top, governedBy: 'maximum-speed' };
  if (best < spec.minRotorSpeedRadS)
    return { omega: Math.min(top, spec.minRotorSpeedRadS), governedBy: 'minimum-speed' };
  return { omega: best, governedBy: 'optimum' };
}

/** Smallest pitch toward feather at which `pick` is no longer above `limit`; null where no pitch within the limits does it. */
function pitchFor(
  rotor: Rotor,
  wind: number,
  omega: number,
  from: number,
  to: number,
  limit: number,
  pick: (point: PointResult) => number | null,
): number | null {
  const excess = (pitchDeg: number) =>
    (pick(solvePoint(rotor, { windSpeedMS: wind, rotorSpeedRadS: omega, pitchDeg })) ?? NaN) / limit - 1;
  let low = from;
  for (let high = from + PITCH_STEP_DEG; low < to; high += PITCH_STEP_DEG) {
    const end = Math.min(high, to);
    if (excess(end) <= 0) {
      const root = brent(excess, low, end, PITCH_TOLERANCE_DEG);
      return root.status === 'converged' ? root.x : end;
    }
    low = end;
  }
  return null;
}

function hold(rotor: Rotor, spec: ScheduleSpec, wind: number, limitPower: boolean): Held {
  const { omega, governedBy } = rotorSpeed(spec, rotor.tipRadiusM, wind);
  const solve = (pitchDeg: number) =>
    solvePoint(rotor, { windSpeedMS: wind, rotorSpeedRadS: omega, pitchDeg });
  const fine = Math.min(spec.maxPitchDeg, Math.max(spec.minPitchDeg, spec.finePitchDeg));
  let point = solve(fine);
  let governor: Governor = governedBy;
  if (spec.control === 'fixed-speed-stall') return { point, governedBy: governor };
  const rules: [Governor, number | null, (p: PointResult) => number | null][] = [
    ['thrust-limit', spec.thrustLimitN, (p) => p.thrustN],
    ['rated-power', limitPower ? spec.ratedPowerW / spec.drivetrainEfficiency : null, (p) => p.powerW],
  ];
  for (const [name, limit, pick] of rules) {
    if (limit === null || (pick(point) ?? 0) <= limit) continue;
    const pitch = pitchFor(rotor, wind, omega, point.pitchDeg, spec.maxPitchDeg, limit, pick);
    point = solve(pitch ?? spec.maxPitchDeg);
    governor = pitch === null ? 'pitch-limit' : name;
  }
  return { point, governedBy: governor };
}

function schedulePoint({ point, governedBy }: Held, spec: ScheduleSpec): SchedulePoint {
  return {
    windSpeedMS: point.windSpeedMS,
    rotorSpeedRadS: (point.rotorSpeedRpm * Math.PI) / 30,
    pitchDeg: point.pitchDeg,
    governedBy,
    status: point.status,
    cp: point.cp,
    ct: point.ct,
    powerW: point.powerW,
    electricalPowerW: point.powerW === null ? null : Math.max(0, point.powerW * spec.drivetrainEfficiency),
    thrustN: point.thrustN,
    rootFlapMomentNm: point.rootFlapMomentNm,
    rootEdgeMomentNm: point.rootEdgeMomentNm,
  };
}

function ratedWind(rotor: Rotor, spec: ScheduleSpec, winds: readonly number[]): number | null {
  const excess = (wind: number) =>
    ((hold(rotor, spec, wind, false).point.powerW ?? NaN) * spec.drivetrainEfficiency) / spec.ratedPowerW - 1;
  for (let i = 0; i < winds.length; i += 1) {
    const wind = winds[i] ?? 0;
    if (!(excess(wind) >= 0)) continue;
    const before = winds[i - 1];
    if (before === undefined) return wind;
    const root = brent(excess, before, wind, 1e-9);
    return root.status === 'converged' ? root.x : wind;
  }
  return null;
}

/**
 * The operating schedule over wind speeds (m/s, ascending): optimum tip-speed ratio between the speed limits, pitch to
 * feather from the fine pitch to hold the thrust limit and rated power; or one speed, stall-regulated. Found by solving at
 * each wind speed on its own, so that a schedule does not depend on which speeds are asked for.
 */
export function operatingSchedule(
  rotor: Rotor,
  spec: ScheduleSpec,
  windSpeeds: readonly number[],
): ScheduleResult {
  requireNumber('ratedPowerW', spec.ratedPowerW, 0, Infinity, true);
  requireNumber('drivetrainEfficiency', spec.drivetrainEfficiency, 0, 1, true);
  requireNumber('maxRotorSpeedRadS', spec.maxRotorSpeedRadS, 0, Infinity, true);
  requireNumber('maxTipSpeedMS', spec.maxTipSpeedMS, 0, Infinity, true);
  requireNumber('maxPitchDeg', spec.maxPitchDeg, spec.minPitchDeg);
  const points = windSpeeds.map((wind, i) =>
    schedulePoint(hold(rotor, spec, requireNumber(`windSpeeds[${i}]`, wind, 0, Infinity, true), true), spec),
  );
  return { points, ratedWindSpeedMS: ratedWind(rotor, spec, windSpeeds) };
}
