import { describe, expect, it } from 'vitest';
import { airAt } from './new-specification.ts';

describe('airAt', () => {
  it('is the standard atmosphere (ISO 2533:1975, table 1: 0 m and 2000 m)', () => {
    expect(airAt(0, null)).toEqual({ airDensityKgM3: 1.225, airViscosityPaS: 0.00001789 });
    // 1.006 49 kg/m³ at 2000 m geopotential height, to the four figures that are given.
    expect(airAt(2000, null)?.airDensityKgM3).toBe(1.006);
  });

  it('keeps the pressure when the day is warmer: density falls as absolute temperature rises', () => {
    expect(airAt(0, 35)?.airDensityKgM3).toBeCloseTo((1.225 * 288.15) / 308.15, 3);
  });

  it('has no answer outside the standard', () => {
    expect(airAt(12_000, null)).toBeNull();
    expect(airAt(0, 200)).toBeNull();
  });
});
