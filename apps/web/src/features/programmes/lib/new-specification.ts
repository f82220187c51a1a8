import { isaAir } from '@tipward/bem-solver';
import type { Specification } from '@tipward/contract';

const seaLevel = isaAir(0);
const digits = (value: number, count: number) => Number(value.toPrecision(count));

/** What a new programme begins with where a usual value exists; the rotor itself is left for the lead to state. */
export const NEW_SPECIFICATION: Partial<Specification> = {
  bladeCount: 3,
  coneDeg: 0,
  control: 'variable-speed-pitch',
  minPitchDeg: 0,
  maxPitchDeg: 90,
  drivetrainEfficiency: 0.9,
  airDensityKgM3: digits(seaLevel.densityKgM3, 4),
  airViscosityPaS: digits(seaLevel.viscosityPaS, 4),
  windClass: 'III',
  meanWindSpeedMS: 7.5,
  weibullShape: 2,
  cutInMS: 3,
  cutOutMS: 25,
  designTipSpeedRatio: 7,
  thrustLimitKN: null,
  lossesPct: 5,
};

/**
 * Density and viscosity of the standard atmosphere at a height, optionally at another temperature (ISO 2533).
 * @returns null where height (m) or temperature (°C) is outside what the standard covers
 */
export function airAt(heightM: number, temperatureC: number | null) {
  try {
    const standard = isaAir(heightM);
    const air =
      temperatureC === null ? standard : isaAir(heightM, temperatureC + 273.15 - standard.temperatureK);
    return { airDensityKgM3: digits(air.densityKgM3, 4), airViscosityPaS: digits(air.viscosityPaS, 4) };
  } catch {
    // Outside −1000…11 000 m or 80 K from standard: the solver says so by throwing.
    return null;
  }
}
