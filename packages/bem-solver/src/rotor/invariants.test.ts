import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compilePolar, compileRotor, solvePoint } from '../index.ts';
import type { PointResult, RotorGeometry } from '../index.ts';

const RAD = Math.PI / 180;
const alphaDeg = Array.from({ length: 145 }, (_, i) => -180 + 2.5 * i);
const polar = compilePolar({
  alphaDeg,
  cl: alphaDeg.map((a) => (Math.abs(a) < 14 ? 6 * Math.sin((a + 3) * RAD) : 1.1 * Math.sin(2 * a * RAD))),
  cd: alphaDeg.map((a) => 0.008 + 1.2 * Math.sin(a * RAD) ** 2),
});

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const blade = fc.record({
  bladeCount: fc.integer({ min: 1, max: 5 }),
  hubShare: number(0.02, 0.3),
  chords: fc.array(number(0, 0.15), { minLength: 2, maxLength: 12 }),
  twists: fc.array(number(-10, 40), { minLength: 12, maxLength: 12 }),
});
const state = fc.record({ wind: number(2, 30), ratio: number(0, 15), pitchDeg: number(-20, 95) });

/** A blade of tip radius `scale`; chords are shares of it. */
function geometry(
  { bladeCount, hubShare, chords, twists }: typeof blade extends fc.Arbitrary<infer T> ? T : never,
  scale: number,
): RotorGeometry {
  const stations = chords.map((chord, i) => ({
    radiusM: scale * (hubShare + ((1 - hubShare) * (i + 0.5)) / chords.length),
    chordM: scale * chord,
    twistDeg: twists[i] ?? 0,
    polar,
  }));
  return { bladeCount, hubRadiusM: scale * hubShare, tipRadiusM: scale, stations };
}

const close = (a: number | null, b: number | null, size: number) =>
  expect(Math.abs((a ?? NaN) - (b ?? NaN))).toBeLessThanOrEqual(1e-9 * (size + Math.abs(a ?? NaN)));

function solve(
  rotor: RotorGeometry,
  wind: number,
  ratio: number,
  pitchDeg: number,
  densityKgM3 = 1.2,
): PointResult {
  const point = { windSpeedMS: wind, rotorSpeedRadS: (ratio * wind) / rotor.tipRadiusM, pitchDeg };
  return solvePoint(compileRotor(rotor, { densityKgM3, viscosityPaS: 1.8e-5 }), point);
}

describe('for any blade in any state', () => {
  it('power is torque times speed, and what the coefficients say', () => {
    fc.assert(
      fc.property(blade, state, (shape, { wind, ratio, pitchDeg }) => {
        const point = solve(geometry(shape, 20), wind, ratio, pitchDeg);
        expect(point.status).toBe('converged');
        close(point.powerW, ((point.torqueNm ?? NaN) * ratio * wind) / 20, 1);
        close(point.powerW, (point.cp ?? NaN) * 0.6 * Math.PI * 400 * wind ** 3, 1);
        close(point.thrustN, (point.ct ?? NaN) * 0.6 * Math.PI * 400 * wind ** 2, 1);
      }),
      { numRuns: 150, seed: 42 },
    );
  });
  it('coefficients do not know the unit of length, the wind speed at one λ, or the density', () => {
    fc.assert(
      fc.property(blade, state, number(0.01, 1000), (shape, { wind, ratio, pitchDeg }, unit) => {
        const a = solve(geometry(shape, 20), wind, ratio, pitchDeg);
        const b = solve(geometry(shape, 20 * unit), 3 * wind, ratio, pitchDeg, 0.7);
        for (const name of ['cp', 'ct', 'cq'] as const) close(a[name], b[name], 1);
        close((a.rootFlapMomentNm ?? NaN) * unit ** 3 * 9 * (0.7 / 1.2), b.rootFlapMomentNm, unit ** 3);
      }),
      { numRuns: 100, seed: 43 },
    );
  });
  it('without losses, blade count and chord act through their product', () => {
    fc.assert(
      fc.property(blade, state, (shape, { wind, ratio, pitchDeg }) => {
        const solveFree = (count: number, factor: number) => {
          const g = geometry({ ...shape, bladeCount: count }, 20);
          const stations = g.stations.map((s) => ({ ...s, chordM: s.chordM * factor }));
          return solvePoint(compileRotor({ ...g, stations }, undefined, { tipLoss: false, hubLoss: false }), {
            windSpeedMS: wind,
            rotorSpeedRadS: (ratio * wind) / 20,
            pitchDeg,
          });
        };
        close(solveFree(2, 1).cp, solveFree(4, 0.5).cp, 1);
      }),
      { numRuns: 80, seed: 44 },
    );
  });
});
