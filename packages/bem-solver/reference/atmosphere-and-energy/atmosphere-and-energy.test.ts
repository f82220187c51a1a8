import { describe, it } from 'vitest';
import { annualEnergy, isaAir, windShareBelow } from '../../src/index.ts';
import { holds } from '../print-error.ts';

/** Height (m), density, viscosity: ISO 2533. */
const ISA: readonly (readonly [number, number, number])[] = [
  [0, 1.225, 1.7893803e-5],
  [1000, 1.1116425, 1.7578455e-5],
  [2000, 1.0064901, 1.7259615e-5],
  [5000, 0.73611555, 1.6281177e-5],
];
/** Mean wind (m/s), energy of the example machine by the bin sum (kWh). */
const ENERGY: readonly (readonly [number, number])[] = [
  [5, 1173117.412],
  [7, 2649948.2236],
  [8, 3385980.3919],
  [10, 4585085.6128],
];

describe('atmosphere and energy', () => {
  it('ISO 2533', () => {
    const errors = ISA.map(([height, rho, mu]) => {
      const air = isaAir(height);
      return Math.max(Math.abs(air.densityKgM3 / rho - 1), Math.abs(air.viscosityPaS / mu - 1));
    });
    holds('density and viscosity', Math.max(...errors), 2e-7);
  });
  it('bin method of IEC 61400-12-1', () => {
    const curve = Array.from({ length: 45 }, (_, i) => ({
      windSpeedMS: 3 + i / 2,
      powerW: 1e6 * Math.min(((3 + i / 2) / 12) ** 3, 1),
    }));
    const errors = ENERGY.map(([meanMS, kWh]) =>
      Math.abs(annualEnergy(curve, { kind: 'rayleigh', meanMS }).energyWh / 1000 / kWh - 1),
    );
    holds('energy', Math.max(...errors), 1e-6);
  });
  it('a Weibull distribution of shape 2 is a Rayleigh distribution', () => {
    const error = Math.abs(
      windShareBelow({ kind: 'weibull', meanMS: 8, shape: 2 }, 9) -
        windShareBelow({ kind: 'rayleigh', meanMS: 8 }, 9),
    );
    holds('share below 9 m/s', error, 1e-12);
  });
});
