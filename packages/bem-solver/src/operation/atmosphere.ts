import { requireNumber } from '../input-error.ts';

const G0 = 9.80665;
const GAS = 287.05287;
const LAPSE = 0.0065;

/**
 * Standard atmosphere up to 11 km geopotential height (ISO 2533:1975), with Sutherland's viscosity, optionally warmer or
 * colder than standard by `offsetK` at the same pressure.
 * @returns density kg/m³, viscosity Pa·s, temperature K, pressure Pa, speed of sound m/s
 */
export function isaAir(heightM: number, offsetK = 0) {
  requireNumber('heightM', heightM, -1000, 11000);
  requireNumber('offsetK', offsetK, -80, 80);
  const standardK = 288.15 - LAPSE * heightM;
  const pressurePa = 101325 * (standardK / 288.15) ** (G0 / (GAS * LAPSE));
  const temperatureK = standardK + offsetK;
  return {
    densityKgM3: pressurePa / (GAS * temperatureK),
    viscosityPaS: (1.458e-6 * temperatureK ** 1.5) / (temperatureK + 110.4),
    temperatureK,
    pressurePa,
    soundSpeedMS: Math.sqrt(1.4 * GAS * temperatureK),
  };
}
