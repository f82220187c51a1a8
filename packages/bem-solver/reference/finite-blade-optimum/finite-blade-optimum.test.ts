import { describe, it } from 'vitest';
import { solvePoint } from '../../src/index.ts';
import { finiteBladeOptimum } from './finite-blade-rotor.ts';
import { LOSSLESS, optimumRotor } from '../lossless-rotor.ts';
import { holds } from '../print-error.ts';

/** λ, cl/cd, CP: no tip loss, induction from lift only. */
const WITH_DRAG: readonly (readonly [number, number, number])[] = [
  [4, 100, 0.53790937],
  [7, 100, 0.53807818],
  [7, 50, 0.49667764],
  [10, 100, 0.52603372],
];
/** λ, CP with Prandtl's factor, three blades, no drag. */
const WITH_TIP_LOSS: readonly (readonly [number, number])[] = [
  [6, 0.52161],
  [7, 0.53221],
  [8, 0.54016],
  [10, 0.55125],
];

/** B, cl/cd, λ, CP: optimum with Prandtl's factor and drag, by integration (see SOURCE.md). */
const OPTIMUM: readonly (readonly [number, number, number, number])[] = [
  [3, 25, 4, 0.40708],
  [3, 50, 6, 0.45926],
  [3, 50, 7, 0.45846],
  [3, 50, 10, 0.44354],
  [3, 100, 7, 0.49501],
  [3, 100, 15, 0.48247],
  [3, Infinity, 7, 0.53221],
  [2, 100, 8, 0.47978],
  [1, 100, 10, 0.44437],
  [1, Infinity, 6, 0.4383],
];

describe('optimum rotor with drag and finite blades', () => {
  it.each(WITH_DRAG)('λ %d, cl/cd %d: drag', (lambda, glide, cp) => {
    const rotor = optimumRotor({
      tipSpeedRatio: lambda,
      elements: 100,
      drag: 1 / glide,
      options: { ...LOSSLESS, dragInInduction: false },
    });
    const point = solvePoint(rotor, { windSpeedMS: 10, rotorSpeedRadS: 2 * lambda, pitchDeg: 0 });
    // The table integrates from the axis; a hub of 0.005 R and 100 stations are worth 1e-4.
    holds(`CP at λ ${lambda}, cl/cd ${glide}`, Math.abs((point.cp ?? NaN) - cp), 1e-4);
  });
  it.each(WITH_TIP_LOSS)('λ %d: Prandtl’s factor', (lambda, cp) => {
    const rotor = optimumRotor({
      tipSpeedRatio: lambda,
      elements: 100,
      options: { tipLoss: true, hubLoss: false },
    });
    const point = solvePoint(rotor, { windSpeedMS: 10, rotorSpeedRadS: 2 * lambda, pitchDeg: 0 });
    holds(`CP at λ ${lambda}`, Math.abs((point.cp ?? NaN) / cp - 1), 0.005);
  });
  it.each(OPTIMUM)(
    '%d blades, cl/cd %d, λ %d: optimum with tip loss and drag',
    (blades, glide, lambda, cp) => {
      const rotor = finiteBladeOptimum(blades, glide, lambda);
      const point = solvePoint(rotor, { windSpeedMS: 10, rotorSpeedRadS: 10 * lambda, pitchDeg: 0 });
      holds(`CP, B ${blades}, cl/cd ${glide}, λ ${lambda}`, Math.abs((point.cp ?? NaN) / cp - 1), 5e-4);
    },
  );
});
