import { describe, expect, it } from 'vitest';
import { compilePolar, compileRotor, solveCurve, solvePoint } from '../index.ts';
import type { PointResult, Rotor, RotorGeometry, SolverOptions } from '../index.ts';

const RAD = Math.PI / 180;
const alphaDeg = Array.from({ length: 361 }, (_, i) => -180 + i);
/** Abrupt stall, so that inboard sections have several roots. */
const polar = compilePolar({
  alphaDeg,
  cl: alphaDeg.map((a) => (Math.abs(a) < 13 ? 6 * Math.sin((a + 3) * RAD) : 1.1 * Math.sin(2 * a * RAD))),
  cd: alphaDeg.map((a) => 0.008 + 1.2 * Math.sin(a * RAD) ** 2),
});

/** Stations on hub and tip radius, chord running out at the tip. */
function geometry(count = 21): RotorGeometry {
  return {
    bladeCount: 3,
    hubRadiusM: 0.5,
    tipRadiusM: 10,
    stations: Array.from({ length: count }, (_, i) => {
      const share = i / (count - 1);
      return {
        radiusM: i === count - 1 ? 10 : 0.5 + 9.5 * share,
        chordM: 1.1 * (1 - share),
        twistDeg: 18 * (1 - share) ** 2,
        polar,
      };
    }),
  };
}
const rotor = (options: Partial<SolverOptions> = {}): Rotor =>
  compileRotor(geometry(), { densityKgM3: 1.225, viscosityPaS: 1.8e-5 }, options);

function everyNumber(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  if (typeof value === 'object' && value !== null) return Object.values(value).flatMap(everyNumber);
  return [];
}

const solve = (windSpeedMS: number, rotorSpeedRadS: number, pitchDeg: number, r = rotor()): PointResult =>
  solvePoint(r, { windSpeedMS, rotorSpeedRadS, pitchDeg }, { sections: true });

describe('every operating state', () => {
  it('has a status and no NaN, parked to runaway, reversed to feathered, with each option', () => {
    const options: Partial<SolverOptions>[] = [
      {},
      { tipLoss: false, hubLoss: false },
      { dragInInduction: false },
      { highInduction: 'glauert' },
      { highInduction: 'straight-tangent' },
    ];
    for (const r of options.map(rotor))
      for (const omega of [0, 1e-6, 0.3, 3, 8, 40])
        for (const pitch of [-180, -90, -20, -3, 0, 4, 30, 85, 90, 120, 180]) {
          const point = solve(10, omega, pitch, r);
          expect(point.status).toBe('converged');
          expect(everyNumber(point).filter((x) => !Number.isFinite(x))).toEqual([]);
          expect(point.cp).toBeCloseTo((point.cq ?? NaN) * point.tipSpeedRatio, 12);
          expect(point.powerW).toBeCloseTo((point.torqueNm ?? NaN) * omega, 5);
        }
  });
  it('parked: no power, thrust as on a flat plate, tangential induction undefined', () => {
    const point = solve(10, 0, 0);
    expect(point.cp).toBe(0);
    expect(Object.is(point.powerW, 0)).toBe(true);
    expect(point.thrustN).toBeGreaterThan(0);
    expect(point.sections?.[5]?.tangentialInduction).toBeNull();
    expect(point.sections?.[5]?.axialInduction).not.toBeNull();
  });
  it('feathered and turning slowly: next to no torque, no propeller-brake root', () => {
    const point = solve(10, 0.001, 85);
    expect(Math.abs(point.cq ?? NaN)).toBeLessThan(0.02);
    for (const s of point.sections ?? [])
      if (s.status === 'converged') expect(s.inflowDeg).toBeGreaterThan(0);
  });
  it('stations on hub and tip radius carry no load while the losses are on', () => {
    const sections = solve(8, 6, 0).sections ?? [];
    for (const end of [sections[0], sections.at(-1)])
      expect(end).toMatchObject({
        status: 'no-load',
        lossFactor: 0,
        normalForceNM: 0,
        tangentialForceNM: 0,
        inflowDeg: null,
      });
    const free = solve(8, 6, 0, rotor({ tipLoss: false, hubLoss: false })).sections ?? [];
    expect(free[0]?.status).toBe('converged');
    expect(free[0]?.lossFactor).toBe(1);
  });
  it('a section without chord has no induction and no force', () => {
    const free = solve(8, 6, 0, rotor({ tipLoss: false, hubLoss: false })).sections?.at(-1);
    expect(free?.axialInduction).toBeCloseTo(0, 12);
    expect(free?.normalForceNM).toBe(0);
  });
  it('totals are those of the sections: trapezoid over hub, stations, tip', () => {
    const point = solve(9, 6, 2);
    const sections = point.sections ?? [];
    let [thrust, torque, flap] = [0, 0, 0];
    for (let i = 1; i < sections.length; i += 1) {
      const [a, b] = [sections[i - 1], sections[i]];
      if (a === undefined || b === undefined) throw new Error('no section');
      const half = 0.5 * (b.radiusM - a.radiusM);
      const [na, nb] = [a.normalForceNM ?? NaN, b.normalForceNM ?? NaN];
      thrust += 3 * half * (na + nb);
      flap += half * (na * (a.radiusM - 0.5) + nb * (b.radiusM - 0.5));
      torque +=
        3 * half * ((a.tangentialForceNM ?? NaN) * a.radiusM + (b.tangentialForceNM ?? NaN) * b.radiusM);
    }
    expect(Math.abs(thrust / (point.thrustN ?? NaN) - 1)).toBeLessThan(1e-10);
    expect(Math.abs(torque / (point.torqueNm ?? NaN) - 1)).toBeLessThan(1e-10);
    expect(Math.abs(flap / (point.rootFlapMomentNm ?? NaN) - 1)).toBeLessThan(1e-10);
  });
});

describe('path independence', () => {
  const r = rotor();
  const ratios = Array.from({ length: 120 }, (_, i) => 0.1 * i);
  it.each([-10, 0, 3, 25, 80])('curve, shuffled curve and single points agree, pitch %d°', (pitchDeg) => {
    const curve = solveCurve(r, { pitchDeg, tipSpeedRatios: ratios });
    const shuffled = ratios.map((_, i) => ratios[(i * 77) % ratios.length] ?? 0);
    const other = solveCurve(r, { pitchDeg, tipSpeedRatios: shuffled });
    let several = 0;
    shuffled.forEach((ratio, k) => {
      const i = ratios.indexOf(ratio);
      expect(other.cp[k]).toBe(curve.cp[i]);
      const point = solve(7, (ratio * 7) / 10, pitchDeg, r);
      several += (point.sections ?? []).filter((s) => s.multipleRoots).length;
      for (const name of ['cp', 'ct', 'cq'] as const)
        expect(Math.abs((point[name] ?? NaN) - (curve[name][i] ?? NaN))).toBeLessThanOrEqual(1e-10);
      expect(curve.statuses[i]).toBe(point.status);
    });
    // The rule is at work: some sections of the case have several roots.
    if (pitchDeg === 0) expect(several).toBeGreaterThan(0);
  });
});

describe('a section without a solution', () => {
  it('gives a status, the failed station and nulls', () => {
    // Thrust in place of drag, and lift no section has: nothing balances it at low speed.
    const impossible = compilePolar({ alphaDeg: [-180, 180], cl: [-20, -20], cd: [-8, -8] });
    const base = geometry();
    const stations = base.stations.map((s, i) => (i === 4 ? { ...s, chordM: 2.5, polar: impossible } : s));
    const broken = compileRotor({ ...base, stations });
    const point = solve(10, 0.5, 0, broken);
    expect(point).toMatchObject({
      status: 'sections-unsolved',
      failedStations: [4],
      cp: null,
      thrustN: null,
    });
    expect(point.sections?.[4]).toMatchObject({
      status: 'no-solution',
      inflowDeg: null,
      normalForceNM: null,
    });
    expect(point.sections?.[5]?.status).toBe('converged');
    const curve = solveCurve(broken, { pitchDeg: 0, tipSpeedRatios: [0.5] });
    expect(curve.statuses[0]).toBe('sections-unsolved');
    expect(curve.cp[0]).toBeNaN();
  });
});
