import { compilePolar, compileRotor, schmitzSection } from '../src/index.ts';
import type { PolarTable, Rotor, SolverOptions } from '../src/index.ts';

export interface OptimumRotor {
  readonly tipSpeedRatio: number;
  readonly bladeCount?: number;
  readonly elements: number;
  readonly lift?: number;
  readonly drag?: number;
  readonly options?: Partial<SolverOptions>;
}

const TIP = 5;
export const LOSSLESS = { tipLoss: false, hubLoss: false } as const;

/** A section of constant lift and drag at every angle, so that the planform alone is under test. */
function constantPolar(lift: number, drag: number): PolarTable {
  return { alphaDeg: [-180, 180], cl: [lift, lift], cd: [drag, drag] };
}

/** The optimum blade with wake rotation on cosine-spaced stations from hub (0.005 R) to tip, ends included. */
export function optimumRotor({
  tipSpeedRatio,
  bladeCount = 3,
  elements,
  lift = 1,
  drag = 0,
  options = LOSSLESS,
}: OptimumRotor): Rotor {
  const hub = 0.005 * TIP;
  const polar = compilePolar(constantPolar(lift, drag));
  const stations = Array.from({ length: elements }, (_, i) => {
    const radiusM = Math.min(TIP, hub + 0.5 * (TIP - hub) * (1 - Math.cos((Math.PI * i) / (elements - 1))));
    const best = schmitzSection({ bladeCount, tipRadiusM: TIP, tipSpeedRatio, lift }, radiusM);
    return { radiusM, chordM: best.chordM, twistDeg: (best.phi * 180) / Math.PI, polar };
  });
  return compileRotor({ bladeCount, hubRadiusM: hub, tipRadiusM: TIP, stations }, undefined, options);
}
