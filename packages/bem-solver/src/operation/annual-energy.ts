import { SolverInputError, requireNumber } from '../input-error.ts';

export type WindDistribution =
  | { readonly kind: 'rayleigh'; readonly meanMS: number }
  | { readonly kind: 'weibull'; readonly meanMS: number; readonly shape: number }
  | { readonly kind: 'weibull'; readonly scaleMS: number; readonly shape: number };

export interface PowerPoint {
  readonly windSpeedMS: number;
  readonly powerW: number;
}

const HOURS = 8760;

/** Γ(x) for x > 0 by Lanczos' series (g = 7, nine terms; coefficients from memory, checked against Γ(½) and Γ(5) in the tests). */
export function gamma(x: number): number {
  const terms = [
    0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059,
    12.507343278686905, -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
  ];
  const z = x - 1;
  const sum = terms.reduce((total, term, i) => total + (i === 0 ? term : term / (z + i)), 0);
  const t = z + 7.5;
  return Math.sqrt(2 * Math.PI) * t ** (z + 0.5) * Math.exp(-t) * sum;
}

/** Share of the year below a wind speed. Rayleigh: 1 − exp(−(π/4)(V/Vave)²); Weibull scale from the mean by Γ(1 + 1/k). */
export function windShareBelow(wind: WindDistribution, speedMS: number): number {
  if (speedMS <= 0) return 0;
  if (wind.kind === 'rayleigh') return 1 - Math.exp((-Math.PI / 4) * (speedMS / wind.meanMS) ** 2);
  const scale = 'scaleMS' in wind ? wind.scaleMS : wind.meanMS / gamma(1 + 1 / wind.shape);
  return 1 - Math.exp(-((speedMS / scale) ** wind.shape));
}

function checkWind(wind: WindDistribution): void {
  if ('scaleMS' in wind) requireNumber('scaleMS', wind.scaleMS, 0, Infinity, true);
  else requireNumber('meanMS', wind.meanMS, 0, Infinity, true);
  if (wind.kind === 'weibull') requireNumber('shape', wind.shape, 0.5, 20);
}

/** Points must ascend and carry finite power. */
function checkCurve(curve: readonly PowerPoint[]): void {
  if (curve.length < 1) throw new SolverInputError('curve', 'empty', 'at least 1 point');
  curve.forEach((point, i) => {
    if (!Number.isFinite(point.powerW))
      throw new SolverInputError(`curve[${i}].powerW`, point.powerW, 'a finite number');
    const before = curve[i - 1]?.windSpeedMS ?? -Infinity;
    requireNumber(`curve[${i}].windSpeedMS`, point.windSpeedMS, 0);
    if (point.windSpeedMS <= before)
      throw new SolverInputError(`curve[${i}].windSpeedMS`, point.windSpeedMS, `above ${before} m/s`);
  });
}

/**
 * Energy of a year in W·h by the bin method of IEC 61400-12-1: Nh Σ [F(Vi) − F(Vi−1)]·(Pi−1 + Pi)/2, with P = 0 at half a
 * step (0.5 m/s) below the first point; points outside [cutInMS, cutOutMS] are left out.
 * Throws SolverInputError where speeds do not ascend, a number is not finite, or no point lies between cut-in and cut-out.
 */
export function annualEnergy(
  curve: readonly PowerPoint[],
  wind: WindDistribution,
  cutInMS = 0,
  cutOutMS = Infinity,
): { energyWh: number } {
  checkCurve(curve);
  checkWind(wind);
  const inside = curve.filter((point) => point.windSpeedMS >= cutInMS && point.windSpeedMS <= cutOutMS);
  const first = inside[0];
  if (first === undefined)
    throw new SolverInputError('curve', `no point from ${cutInMS} to ${cutOutMS} m/s`, 'at least 1 point');
  let before: PowerPoint = { windSpeedMS: first.windSpeedMS - 0.5, powerW: 0 };
  let sum = 0;
  for (const point of inside) {
    const share = windShareBelow(wind, point.windSpeedMS) - windShareBelow(wind, before.windSpeedMS);
    sum += 0.5 * share * (before.powerW + point.powerW);
    before = point;
  }
  return { energyWh: HOURS * sum };
}
