import { requireNumber } from '../input-error.ts';
import { schmitzSection } from './planform.ts';

export interface SizingInput {
  readonly bladeCount: number;
  readonly hubRadiusM: number;
  readonly tipRadiusM: number;
  readonly tipSpeedRatio: number;
  /** Lift coefficient to design for: one for the whole span, or by r/R. */
  readonly designLift: number | ((share: number) => number);
  /** Angle of attack of the design lift (°). */
  readonly designAlphaDeg: number;
  readonly maxChordM?: number;
  readonly maxTwistDeg?: number;
  readonly stationCount?: number;
}

/** Share of span up to which the section is round, from which it is an airfoil, and the root's diameter over R: common practice. */
const ROUND_TO = 0.05;
const AIRFOIL_FROM = 0.22;
const ROOT_DIAMETER = 0.042;
const TIP_FROM = 0.95;

/** min(value, cap) with a rounded corner; never above the cap. */
function softCap(value: number, cap: number, width: number): number {
  const over = (cap - value) / width;
  // log1p(e^x) without overflow
  const soft = over > 0 ? over + Math.log1p(Math.exp(-over)) : Math.log1p(Math.exp(over));
  return cap - width * soft + 0;
}

const smoothStep = (share: number) => {
  const t = Math.min(1, Math.max(0, share));
  return t * t * (3 - 2 * t);
};

/** Radii from just outside the hub to the tip, closer together at both ends. */
function stationRadii(hub: number, tip: number, count: number): number[] {
  return Array.from({ length: count }, (_, i) => {
    const even = i / (count - 1);
    const eased = 0.7 * even + 0.3 * 0.5 * (1 - Math.cos(Math.PI * even));
    return hub + 0.01 * (tip - hub) + 0.99 * (tip - hub) * eased;
  });
}

/**
 * A first blade: the optimum planform with wake rotation, chord and twist capped with rounded corners, blended to a round
 * root and rounded off over the last 5 % of span. Throws SolverInputError on misuse.
 */
export function sizeBlade(input: SizingInput): {
  stations: { radiusM: number; chordM: number; twistDeg: number }[];
} {
  const { hubRadiusM, tipRadiusM, maxTwistDeg = 20, stationCount = 18 } = input;
  requireNumber('tipRadiusM', tipRadiusM, 0, Infinity, true);
  requireNumber('hubRadiusM', hubRadiusM, 0, tipRadiusM, true);
  requireNumber('bladeCount', input.bladeCount, 1, 100);
  requireNumber('tipSpeedRatio', input.tipSpeedRatio, 0.5, 30);
  requireNumber('designAlphaDeg', input.designAlphaDeg, -20, 30);
  requireNumber('stationCount', stationCount, 3, 1000);
  if (input.maxChordM !== undefined) requireNumber('maxChordM', input.maxChordM, 0, Infinity, true);
  const liftAt = (share: number) =>
    requireNumber(
      'designLift',
      typeof input.designLift === 'number' ? input.designLift : input.designLift(share),
      0,
      3,
      true,
    );
  const stations = stationRadii(hubRadiusM, tipRadiusM, stationCount).map((radiusM) => {
    const share = radiusM / tipRadiusM;
    const { bladeCount, tipSpeedRatio } = input;
    const best = schmitzSection({ bladeCount, tipRadiusM, tipSpeedRatio, lift: liftAt(share) }, radiusM);
    const capped =
      input.maxChordM === undefined
        ? best.chordM
        : softCap(best.chordM, input.maxChordM, 0.03 * input.maxChordM);
    const root = ROOT_DIAMETER * tipRadiusM;
    const blend = smoothStep((share - ROUND_TO) / (AIRFOIL_FROM - ROUND_TO));
    const tip = share > TIP_FROM ? 1 - 0.6 * ((share - TIP_FROM) / (1 - TIP_FROM)) ** 2 : 1;
    const twist = (best.phi * 180) / Math.PI - input.designAlphaDeg;
    return {
      radiusM,
      chordM: (root + blend * (capped - root)) * tip,
      twistDeg: softCap(twist, maxTwistDeg, 1),
    };
  });
  return { stations };
}
