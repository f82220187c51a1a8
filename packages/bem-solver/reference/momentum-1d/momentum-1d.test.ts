import { describe, it } from 'vitest';
import { compilePolar, solveSection } from '../../src/index.ts';
import { holds, largestError } from '../print-error.ts';

/** a against CT and CP: Betz 1920, see SOURCE.md. */
const TABLE: readonly (readonly [number, number, number])[] = [
  [0.05, 0.19, 0.1805],
  [0.1, 0.36, 0.324],
  [0.2, 0.64, 0.512],
  [0.25, 0.75, 0.5625],
  [0.3, 0.84, 0.588],
  [1 / 3, 8 / 9, 16 / 27],
];
const OPTIONS = { tipLoss: false, hubLoss: false, dragInInduction: true, highInduction: 'buhl' } as const;
const NO_LOSS = { tip: Infinity, hub: Infinity };

const LOCAL_SPEED_RATIO = 7000;
/** Wake rotation leaves a(1 − a)/λr² = 5e-9 of the power, and as much again in a. */
const TOLERANCE = 1e-8;

/** An annulus without drag, loaded so that momentum theory gives the induction a; thrust and power of the annulus come back. */
function annulus(a: number): { a: number; ct: number; cp: number } {
  const lambda = LOCAL_SPEED_RATIO;
  const kappa = a / (1 - a);
  const phi = Math.atan((1 - a) / lambda);
  const lift = 1;
  const solidity = (4 * Math.sin(phi) ** 2 * kappa) / (lift * Math.cos(phi));
  const polar = compilePolar({ alphaDeg: [-180, 180], cl: [lift, lift], cd: [0, 0] });
  const state = solveSection(
    { solidity, localSpeedRatio: lambda, pitchRad: 0, polar, loss: NO_LOSS },
    OPTIONS,
  );
  return {
    a: state.a,
    ct: solidity * state.cn * state.speedSquared,
    cp: solidity * state.ct * state.speedSquared * lambda,
  };
}

describe('one-dimensional momentum theory (Betz 1920)', () => {
  it('gives back a, CT and CP of the table', () => {
    const solved = TABLE.map(([a]) => annulus(a));
    holds(
      'a',
      largestError(
        solved.map((s) => s.a),
        TABLE.map((row) => row[0]),
      ),
      TOLERANCE,
    );
    holds(
      'CT',
      largestError(
        solved.map((s) => s.ct),
        TABLE.map((row) => row[1]),
      ),
      TOLERANCE,
    );
    holds(
      'CP',
      largestError(
        solved.map((s) => s.cp),
        TABLE.map((row) => row[2]),
      ),
      TOLERANCE,
    );
  });
});
