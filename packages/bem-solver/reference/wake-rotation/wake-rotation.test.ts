import { describe, expect, it } from 'vitest';
import { solvePoint } from '../../src/index.ts';
import { optimumRotor } from '../lossless-rotor.ts';
import { holds } from '../print-error.ts';

/** λ, greatest CP, disk average of 4a(1 − a): Glauert 1935, see SOURCE.md. */
const TABLE: readonly (readonly [number, number, number])[] = [
  [1, 0.41549617, 0.84579691],
  [2, 0.51118664, 0.86890217],
  [5, 0.57038721, 0.88340037],
  [7, 0.57947873, 0.88564272],
  [7.5, 0.58084874, 0.88598108],
  [10, 0.5852337, 0.88706505],
];

/** CP = 8/(729λ²)·[F(1/4) − F(u)], u = 1 − 3a at the tip, with x² = (1 − a)(4a − 1)²/(1 − 3a). */
function closedForm(lambda: number): number {
  let low = 0.25;
  let high = 1 / 3;
  for (let i = 0; i < 200; i += 1) {
    const a = 0.5 * (low + high);
    if (((1 - a) * (4 * a - 1) ** 2) / (1 - 3 * a) < lambda * lambda) low = a;
    else high = a;
  }
  const f = (u: number) =>
    (64 / 5) * u ** 5 + 72 * u ** 4 + 124 * u ** 3 + 38 * u ** 2 - 63 * u - 12 * Math.log(u) - 4 / u;
  return (8 / (729 * lambda * lambda)) * (f(0.25) - f(1 - 3 * low));
}

describe('optimum rotor with wake rotation (Glauert 1935)', () => {
  it.each(TABLE)('λ = %d: closed form', (lambda, cp) => {
    holds(`closed form at λ ${lambda}`, Math.abs(closedForm(lambda) - cp), 1e-6);
  });
  it.each(TABLE)('λ = %d: blade-element march', (lambda, cp, ct) => {
    const point = solvePoint(optimumRotor({ tipSpeedRatio: lambda, elements: 50 }), {
      windSpeedMS: 10,
      rotorSpeedRadS: 2 * lambda,
      pitchDeg: 0,
    });
    expect(point.status).toBe('converged');
    holds(`CP at λ ${lambda}`, Math.abs((point.cp ?? NaN) - cp), 1e-4);
    holds(`CT at λ ${lambda}`, Math.abs((point.ct ?? NaN) - ct), 1e-4);
  });
  it('approaches the closed form with the square of the number of stations', () => {
    const error = (elements: number) =>
      Math.abs(
        (solvePoint(optimumRotor({ tipSpeedRatio: 7, elements }), {
          windSpeedMS: 10,
          rotorSpeedRadS: 14,
          pitchDeg: 0,
        }).cp ?? NaN) - closedForm(7),
      );
    const [coarse, fine] = [error(20), error(40)];
    console.log(`order of convergence ${Math.log2(coarse / fine).toFixed(2)}`);
    expect(coarse / fine).toBeGreaterThan(3);
  });
});
