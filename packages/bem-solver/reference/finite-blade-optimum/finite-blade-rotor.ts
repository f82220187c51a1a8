import { brentMaximum } from '../../src/numerics/maximum.ts';
import { compilePolar, compileRotor, prandtlFactor } from '../../src/index.ts';
import type { Rotor } from '../../src/index.ts';

const ELEMENTS = 100;
const HUB = 0.005;

/** φ that gives the annulus at local speed ratio x the most power; `tip` is (B/2)(1 − r/R)/(r/R). */
function bestInflow(x: number, tip: number, dragOverLift: number): number {
  const power = (phi: number) => {
    const [s, c] = [Math.sin(phi), Math.cos(phi)];
    return prandtlFactor(tip / s) * s * s * (c - x * s) * (s + x * c) * (1 - dragOverLift * (c / s));
  };
  const schmitz = (2 / 3) * Math.atan(1 / x);
  return brentMaximum(power, 0.2 * schmitz, Math.min(1.5 * schmitz, 1.55), 1e-10).x;
}

/** The blade of greatest power under Prandtl's tip loss and drag, R = 1 m, cl = 1, each section set to its φ. */
export function finiteBladeOptimum(bladeCount: number, glide: number, tipSpeedRatio: number): Rotor {
  const polar = compilePolar({ alphaDeg: [-180, 180], cl: [1, 1], cd: [1 / glide, 1 / glide] });
  const stations = Array.from({ length: ELEMENTS - 1 }, (_, i) => {
    const radiusM = HUB + 0.5 * (1 - HUB) * (1 - Math.cos((Math.PI * i) / (ELEMENTS - 1)));
    const tip = (bladeCount / 2) * ((1 - radiusM) / radiusM);
    const x = tipSpeedRatio * radiusM;
    const phi = bestInflow(x, tip, 1 / glide);
    const [s, c] = [Math.sin(phi), Math.cos(phi)];
    const solidity = (4 * prandtlFactor(tip / s) * s * (c - x * s)) / (s + x * c);
    return {
      radiusM,
      chordM: (solidity * 2 * Math.PI * radiusM) / bladeCount,
      twistDeg: (phi * 180) / Math.PI,
      polar,
    };
  });
  return compileRotor({ bladeCount, hubRadiusM: HUB, tipRadiusM: 1, stations }, undefined, {
    hubLoss: false,
    dragInInduction: false,
  });
}
