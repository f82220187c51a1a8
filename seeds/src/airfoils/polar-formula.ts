import { extendViterna } from '@tipward/bem-solver';
import type { PolarData } from '@tipward/contract';

const RAD = Math.PI / 180;
const INVENTED =
  'invented for the demo: smooth formulas, no measurement (seeds/src/airfoils/polar-formula.ts)';

interface Shape {
  readonly thicknessPct: number;
  readonly camberShare: number;
}

const FROM_DEG = -8;
const TO_DEG = 20;

/** Share of attached flow: falls from 1 to 0 about the stall angle (logistic). */
function attached(alphaDeg: number, stallDeg: number, widthDeg: number): number {
  return 1 / (1 + Math.exp((Math.abs(alphaDeg) - stallDeg) / widthDeg));
}

/**
 * Lift and drag of an invented section between −8° and 20°: lift slope near 2π, logistic stall that comes earlier on
 * thicker, dirtier and slower sections, a drag bucket, and drag that falls with the Reynolds number as Re^−0.15.
 */
function coefficients(
  shape: Shape,
  reynolds: number,
  soiled: boolean,
  alphaDeg: number,
): { cl: number; cd: number } {
  const t = shape.thicknessPct / 100;
  const slope = 2 * Math.PI * (0.99 - 0.35 * Math.max(0, t - 0.18)) * (soiled ? 0.96 : 1);
  const zeroLift = -2 * shape.camberShare * (1 - 0.8 * Math.max(0, t - 0.18));
  const speed = Math.log10(reynolds / 1e6);
  const stallDeg = 12.2 + 1.1 * speed - 12 * Math.max(0, t - 0.24) - (soiled ? 2.2 : 0);
  const share = attached(alphaDeg, stallDeg, 1.3 + 4 * Math.max(0, t - 0.21));
  const linear = slope * (Math.sin(alphaDeg * RAD) - Math.sin(zeroLift));
  const plate =
    2 * Math.sin(alphaDeg * RAD) * Math.cos(alphaDeg * RAD) +
    0.5 * Math.sign(alphaDeg) * Math.min(1, Math.abs(alphaDeg) / 10);
  const cl = share * linear + (1 - share) * plate;
  const base =
    (soiled ? 0.0125 : 0.0062) * (1 + 2.2 * t + 45 * Math.max(0, t - 0.2) ** 2) * (reynolds / 1e6) ** -0.15;
  const bucket = 0.0042 * ((linear - 0.75) / 0.75) ** 2;
  return { cl, cd: base + bucket * share + (1 - share) * 1.25 * Math.sin(alphaDeg * RAD) ** 2 };
}

const digits = (value: number, count: number) => Number(value.toFixed(count));

/** One invented polar over the whole circle; deep stall by Viterna–Corrigan, aspect ratio 12. */
export function inventedPolar(shape: Shape, reynolds: number, surfaceState: 'clean' | 'soiled'): PolarData {
  const alphaDeg = Array.from({ length: 2 * (TO_DEG - FROM_DEG) + 1 }, (_, i) => FROM_DEG + i / 2);
  const rows = alphaDeg.map((alpha) => coefficients(shape, reynolds, surfaceState === 'soiled', alpha));
  const table = extendViterna(
    { alphaDeg, cl: rows.map((r) => r.cl), cd: rows.map((r) => r.cd) },
    { aspectRatio: 12 },
  );
  return {
    reynolds,
    surfaceState,
    source: INVENTED,
    alphaDeg: Array.from(table.alphaDeg, (a) => digits(a, 4)),
    cl: Array.from(table.cl, (c) => digits(c, 5)),
    cd: Array.from(table.cd, (c) => digits(c, 6)),
    measuredFromDeg: FROM_DEG,
    measuredToDeg: TO_DEG,
  };
}

/** A cylinder: no lift, one drag coefficient (0.6, turbulent separation; common practice for blade roots). */
export function cylinderPolar(reynolds: number): PolarData {
  const alphaDeg = [-180, -90, 0, 90, 180];
  return {
    reynolds,
    surfaceState: 'clean',
    source: INVENTED,
    alphaDeg,
    cl: alphaDeg.map(() => 0),
    cd: alphaDeg.map(() => 0.6),
    measuredFromDeg: null,
    measuredToDeg: null,
  };
}
