import { describe, expect, it } from 'vitest';
import {
  compileRotor,
  compilePolar,
  maximumCp,
  operatingSchedule,
  refineGeometry,
  retwist,
  sizeBlade,
  solveCurve,
  solvePoint,
  spanLoads,
  SolverInputError,
} from '../index.ts';
import type { Air, Rotor, RotorGeometry, ScheduleSpec } from '../index.ts';

const RAD = Math.PI / 180;
const alphaDeg = Array.from({ length: 361 }, (_, i) => -180 + i);
const polar = compilePolar({
  alphaDeg,
  cl: alphaDeg.map((a) => (Math.abs(a) < 13 ? 6 * Math.sin((a + 3) * RAD) : 1.1 * Math.sin(2 * a * RAD))),
  cd: alphaDeg.map((a) => 0.008 + 1.2 * Math.sin(a * RAD) ** 2),
});

/** No stall jump: results are smooth in everything. */
const smooth = compilePolar({
  alphaDeg,
  cl: alphaDeg.map((a) => 3 * Math.sin(2 * (a + 3) * RAD)),
  cd: alphaDeg.map((a) => 0.008 + 1.2 * Math.sin(a * RAD) ** 2),
});

function blade(scale = 1, bladeCount = 3, chordFactor = 1, section = polar): RotorGeometry {
  const { stations } = sizeBlade({
    bladeCount: 3,
    hubRadiusM: 0.4,
    tipRadiusM: 8,
    tipSpeedRatio: 7,
    designLift: 0.9,
    designAlphaDeg: 5,
    stationCount: 16,
  });
  const inner = stations.slice(0, -1);
  return {
    bladeCount,
    hubRadiusM: 0.4 * scale,
    tipRadiusM: 8 * scale,
    stations: inner.map((s) => ({
      radiusM: s.radiusM * scale,
      chordM: s.chordM * scale * chordFactor,
      twistDeg: s.twistDeg,
      polar: section,
    })),
  };
}
const AIR: Air = { densityKgM3: 1.225, viscosityPaS: 1.8e-5 };
const POINT = { windSpeedMS: 8, rotorSpeedRadS: 7, pitchDeg: 1 };
const rotor = (geometry = blade(), options = {}): Rotor => compileRotor(geometry, AIR, options);

describe('a rotor', () => {
  it('power is torque times speed, CP is CQ times λ', () => {
    const p = solvePoint(rotor(), POINT);
    expect(p.status).toBe('converged');
    expect(p.cp).toBeGreaterThan(0.3);
    expect(p.powerW).toBeCloseTo((p.torqueNm ?? NaN) * POINT.rotorSpeedRadS, 6);
    expect(p.cp).toBeCloseTo((p.cq ?? NaN) * p.tipSpeedRatio, 12);
    expect(p.powerW).toBeCloseTo((p.cp ?? NaN) * 0.5 * 1.225 * Math.PI * 64 * 512, 6);
  });
  it('coefficients do not depend on the unit of length', () => {
    const a = solvePoint(rotor(), POINT);
    const b = solvePoint(rotor(blade(1000)), { ...POINT, rotorSpeedRadS: POINT.rotorSpeedRadS / 1000 });
    expect(b.cp).toBeCloseTo(a.cp ?? NaN, 12);
    expect(b.ct).toBeCloseTo(a.ct ?? NaN, 12);
  });
  it('blade count and chord act through their product where there is no loss', () => {
    const none = { tipLoss: false, hubLoss: false };
    const three = solvePoint(rotor(blade(1, 3, 1), none), POINT);
    const six = solvePoint(rotor(blade(1, 6, 0.5), none), POINT);
    expect(six.cp).toBeCloseTo(three.cp ?? NaN, 12);
  });
  it('curve, single point and maximum agree to 1e-10 whatever else was computed', () => {
    const r = rotor();
    const ratios = Array.from({ length: 60 }, (_, i) => 1 + i * 0.23);
    const forward = solveCurve(r, { pitchDeg: 0, tipSpeedRatios: ratios });
    const backward = solveCurve(r, { pitchDeg: 0, tipSpeedRatios: ratios.toReversed() });
    ratios.forEach((lambda, i) => {
      const single = solvePoint(r, { windSpeedMS: 11, rotorSpeedRadS: (lambda * 11) / 8, pitchDeg: 0 });
      expect(Math.abs((single.cp ?? NaN) - (forward.cp[i] ?? NaN))).toBeLessThanOrEqual(1e-10);
      expect(backward.cp[ratios.length - 1 - i]).toBe(forward.cp[i]);
    });
    const best = maximumCp(r, { pitchDeg: 0, lambdaMin: 1, lambdaMax: 14 });
    expect(best?.cp).toBeGreaterThanOrEqual(Math.max(...forward.cp) - 1e-12);
  });
  it('root moment of the point is the moment of the span loads at the hub', () => {
    const p = solvePoint(rotor(blade(), {}), POINT, { sections: true });
    const loads = spanLoads(p, 8);
    // Trapezoid of q·arm against exact moment of a linear load: the same within the square of the spacing.
    expect(loads.flapMomentNm[0]).toBeCloseTo(p.rootFlapMomentNm ?? NaN, -3);
    expect(Math.abs((loads.flapMomentNm[0] ?? NaN) / (p.rootFlapMomentNm ?? NaN) - 1)).toBeLessThan(0.03);
  });
  it('halving the elements shows second-order convergence where the polar is smooth', () => {
    const stations = blade().stations.map((s) => ({
      radiusM: s.radiusM,
      chordM: s.chordM,
      twistDeg: s.twistDeg,
      thicknessPct: 20,
    }));
    const cp = (n: number) => {
      const g = refineGeometry(stations, 0.4, 8, n);
      const refined = Array.from(g.radiusM, (radiusM, i) => ({
        radiusM,
        chordM: g.chordM[i] ?? 0,
        twistDeg: g.twistDeg[i] ?? 0,
        polar: smooth,
      }));
      return (
        solvePoint(
          compileRotor({ bladeCount: 3, hubRadiusM: 0.4, tipRadiusM: 8, stations: refined }, AIR),
          POINT,
        ).cp ?? NaN
      );
    };
    const [a, b, c] = [cp(25), cp(50), cp(100)];
    console.log(`CP at 25, 50, 100 elements: ${a.toFixed(6)}, ${b.toFixed(6)}, ${c.toFixed(6)}`);
    console.log(`order ${Math.log2((b - a) / (c - b)).toFixed(2)}`);
    expect(Math.abs(c - b)).toBeLessThan(Math.abs(b - a) / 3);
    expect(Math.abs(c - b)).toBeLessThan(3e-4);
  });
  it('twist for maximum power never lowers CP at its tip-speed ratio', () => {
    const before = rotor();
    const best = retwist(before, { tipSpeedRatio: 7 });
    const geometry = blade();
    const after = rotor({
      ...geometry,
      stations: geometry.stations.map((s, i) => ({ ...s, twistDeg: best.twistDeg[i] ?? 0 })),
    });
    const at = (r: Rotor) => solvePoint(r, { windSpeedMS: 8, rotorSpeedRadS: 7, pitchDeg: 0 }).cp ?? NaN;
    expect(at(after)).toBeGreaterThanOrEqual(at(before));
  });
  it('names misuse with field, value and what is allowed', () => {
    expect(() => solvePoint(rotor(), { ...POINT, windSpeedMS: 0 })).toThrow(
      'windSpeedMS is 0; allowed: a number above 0',
    );
    expect(() => compileRotor({ ...blade(), stations: [] }, AIR)).toThrow(SolverInputError);
    const [first] = blade().stations;
    expect(() =>
      compileRotor({ ...blade(), stations: first === undefined ? [] : [first, first] }, AIR),
    ).toThrow('rotor.stations[1].radiusM');
  });
});

describe('an operating schedule', () => {
  const spec: ScheduleSpec = {
    control: 'variable-speed-pitch',
    optimumTipSpeedRatio: 7,
    finePitchDeg: 0,
    minRotorSpeedRadS: 3,
    maxRotorSpeedRadS: 7,
    maxTipSpeedMS: 68,
    ratedPowerW: 48_000,
    drivetrainEfficiency: 0.9,
    minPitchDeg: -2,
    maxPitchDeg: 90,
    thrustLimitN: null,
  };
  const winds = Array.from({ length: 43 }, (_, i) => 3 + i * 0.5);

  it('goes from minimum speed over optimum and maximum speed to rated power, held exactly', () => {
    const { points, ratedWindSpeedMS } = operatingSchedule(rotor(blade(1, 3, 1, smooth)), spec, winds);
    const order = [...new Set(points.map((p) => p.governedBy))];
    expect(order).toEqual(['minimum-speed', 'optimum', 'maximum-speed', 'rated-power']);
    for (const p of points.filter((q) => q.governedBy === 'rated-power'))
      expect(p.electricalPowerW).toBeCloseTo(48_000, 2);
    expect(ratedWindSpeedMS).toBeGreaterThan(8);
    const pitches = points.map((p) => p.pitchDeg);
    expect(pitches).toEqual([...pitches].sort((a, b) => a - b));
  });
  it('holds a thrust limit where one is given', () => {
    const free = operatingSchedule(rotor(blade(1, 3, 1, smooth)), spec, winds);
    const limit = 0.9 * Math.max(...free.points.map((p) => p.thrustN ?? 0));
    const held = operatingSchedule(rotor(blade(1, 3, 1, smooth)), { ...spec, thrustLimitN: limit }, winds);
    for (const p of held.points) expect(p.thrustN).toBeLessThanOrEqual(limit * (1 + 1e-9));
    expect(held.points.some((p) => p.governedBy === 'thrust-limit')).toBe(true);
  });
  it('keeps one speed and pitch where stall regulates', () => {
    const { points } = operatingSchedule(
      rotor(blade(1, 3, 1, smooth)),
      { ...spec, control: 'fixed-speed-stall' },
      winds,
    );
    expect(
      new Set(points.map((p) => `${p.rotorSpeedRadS.toFixed(4)} ${p.pitchDeg} ${p.governedBy}`)),
    ).toEqual(new Set(['7.0000 0 fixed-speed']));
  });
});
