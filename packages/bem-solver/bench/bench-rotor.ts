import type { PolarTable, RotorGeometry } from '../src/index.ts';
import { compilePolar } from '../src/index.ts';

const RAD = Math.PI / 180;

export const TIP_RADIUS = 63;
export const HUB_RADIUS = 1.5;
export const BLADE_COUNT = 3;
const STATIONS = 40;
const POLARS = 5;

/** Rows 1° apart to ±30°, 5° beyond. */
function angles(): number[] {
  const near = Array.from({ length: 61 }, (_, i) => i - 30);
  const far = Array.from({ length: 30 }, (_, i) => 35 + 5 * i);
  return [...far.map((alpha) => -alpha).reverse(), ...near, ...far];
}

/** A made-up section: attached lift, a soft stall, flat plate beyond; thicker sections stall earlier and drag more. */
function section(thickness: number): PolarTable {
  const alphaDeg = angles();
  const stall = 14 - 10 * (thickness - 0.18);
  const cl = alphaDeg.map((alpha) => {
    const attached = 6.1 * Math.sin((alpha + 3.5) * RAD);
    const plate = 1.15 * Math.sin(2 * alpha * RAD);
    const share = 1 / (1 + Math.exp((Math.abs(alpha) - stall) / 1.5));
    return share * attached + (1 - share) * plate;
  });
  const cd = alphaDeg.map((alpha) => 0.006 + 0.02 * thickness + 1.3 * Math.sin(alpha * RAD) ** 2);
  return { alphaDeg, cl, cd };
}

export interface BenchStation {
  readonly radiusM: number;
  readonly chordM: number;
  readonly twistDeg: number;
  readonly polar: number;
}

const tables: readonly PolarTable[] = Array.from({ length: POLARS }, (_, i) => section(0.4 - 0.055 * i));

export const stations: readonly BenchStation[] = Array.from({ length: STATIONS }, (_, i) => {
  const share = (i + 0.5) / STATIONS;
  const radiusM = HUB_RADIUS + (TIP_RADIUS - HUB_RADIUS) * share;
  const local = 7.5 * (radiusM / TIP_RADIUS);
  const phi = (2 / 3) * Math.atan(1 / local);
  const optimum = (8 * Math.PI * radiusM * (1 - Math.cos(phi))) / (BLADE_COUNT * 1.0);
  return {
    radiusM,
    chordM: Math.min(4.6, optimum),
    twistDeg: Math.min(14, phi / RAD - 6),
    polar: Math.min(POLARS - 1, Math.floor(share * POLARS)),
  };
});

export const ratios: readonly number[] = Array.from({ length: 60 }, (_, i) => 1 + 0.2 * i);
export const pitches: readonly number[] = Array.from({ length: 40 }, (_, i) => -5 + i);

export function geometry(): RotorGeometry {
  const polars = tables.map((table) => compilePolar(table));
  return {
    bladeCount: BLADE_COUNT,
    hubRadiusM: HUB_RADIUS,
    tipRadiusM: TIP_RADIUS,
    stations: stations.map((station) => {
      const polar = polars[station.polar];
      if (polar === undefined) throw new Error(`no polar ${station.polar}`);
      return { ...station, polar };
    }),
  };
}
