import { describe, expect, it } from 'vitest';
import { annualEnergy, isaAir, WIND_CLASSES, windShareBelow } from '../index.ts';
import { gamma } from './annual-energy.ts';

const CURVE = Array.from({ length: 45 }, (_, i) => ({
  windSpeedMS: 3 + i / 2,
  powerW: 1e6 * Math.min(((3 + i / 2) / 12) ** 3, 1),
}));

describe('the gamma function', () => {
  it.each([
    [0.5, Math.sqrt(Math.PI)],
    [1, 1],
    [5, 24],
    // Γ(1 + 1/k) for k = 1.5, 2.2, 3: mean over scale of a Weibull distribution.
    [1 + 1 / 1.5, 0.902745293],
    [1 + 1 / 2.2, 0.8856247605],
    [1 + 1 / 3, 0.8929795116],
  ])('of %d', (x, value) => {
    expect(Math.abs(gamma(x) / value - 1)).toBeLessThan(1e-10);
  });
});

describe('annual energy', () => {
  it('takes a Weibull distribution by mean or by scale alike', () => {
    const byMean = annualEnergy(CURVE, { kind: 'weibull', meanMS: 7, shape: 2.2 });
    const byScale = annualEnergy(CURVE, { kind: 'weibull', scaleMS: 7 / 0.8856247605, shape: 2.2 });
    expect(byScale.energyWh / byMean.energyWh).toBeCloseTo(1, 9);
  });
  it('leaves out what lies outside cut-in and cut-out', () => {
    const wind = { kind: 'rayleigh', meanMS: 8 } as const;
    const inside = annualEnergy(
      CURVE.filter((p) => p.windSpeedMS >= 5 && p.windSpeedMS <= 20),
      wind,
    );
    expect(annualEnergy(CURVE, wind, 5, 20)).toEqual(inside);
    expect(inside.energyWh).toBeLessThan(annualEnergy(CURVE, wind).energyWh);
  });
  it('never exceeds rated power all year, and shares add up to 1', () => {
    expect(annualEnergy(CURVE, { kind: 'rayleigh', meanMS: 30 }).energyWh).toBeLessThan(8760e6);
    expect(windShareBelow({ kind: 'rayleigh', meanMS: 8 }, 1000)).toBe(1);
  });
  it.each([
    ['curve', [], { kind: 'rayleigh', meanMS: 8 }],
    ['curve[1].windSpeedMS', [CURVE[1], CURVE[0]], { kind: 'rayleigh', meanMS: 8 }],
    ['curve[0].powerW', [{ windSpeedMS: 5, powerW: NaN }], { kind: 'rayleigh', meanMS: 8 }],
    ['meanMS', CURVE, { kind: 'rayleigh', meanMS: 0 }],
    ['scaleMS', CURVE, { kind: 'weibull', scaleMS: -1, shape: 2 }],
    ['shape', CURVE, { kind: 'weibull', meanMS: 8, shape: 0 }],
  ] as const)('refuses a wrong %s', (field, curve, wind) => {
    const points = curve.flatMap((point) => (point === undefined ? [] : [point]));
    expect(() => annualEnergy(points, wind)).toThrow(expect.objectContaining({ field }));
  });
});

describe('air and wind classes', () => {
  it('warm air is thinner at the same pressure', () => {
    const [cold, warm] = [isaAir(500), isaAir(500, 20)];
    expect(warm.pressurePa).toBe(cold.pressurePa);
    expect(warm.densityKgM3 / cold.densityKgM3).toBeCloseTo(cold.temperatureK / (cold.temperatureK + 20), 12);
    expect(() => isaAir(20_000)).toThrow('heightM is 20000');
  });
  it('the mean of a class is a fifth of its reference speed (IEC 61400-1)', () => {
    for (const { referenceMS, meanMS } of Object.values(WIND_CLASSES))
      expect(meanMS).toBeCloseTo(0.2 * referenceMS, 12);
  });
});
