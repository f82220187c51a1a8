import { describe, expect, it } from 'vitest';
import { buhlInduction, compilePolar, highInductionThrust, solveSection } from '../../src/index.ts';
import { holds, largestError } from '../print-error.ts';

/** F, a, CT by Glauert's curve, CT by Buhl: see SOURCE.md. */
const TABLE: readonly (readonly [number, number, number, number])[] = [
  [1, 0.4, 0.96018251, 0.96],
  [1, 0.5, 1.05571698, 1.05555556],
  [1, 0.7, 1.34014206, 1.34],
  [1, 1, 2.00017006, 2],
  [0.8, 0.4, 0.90616042, 0.768],
  [0.8, 0.5, 0.96018251, 0.85555556],
  [0.8, 0.7, 1.12797464, 1.172],
  [0.8, 1, 1.52903267, 2],
];
/** F, CT, a by Buhl. */
const INVERSE: readonly (readonly [number, number, number])[] = [
  [1, 1, 0.4459029062],
  [1, 1.4, 0.7336020894],
  [0.8, 1, 0.6061239426],
  [0.8, 1.6, 0.8737922423],
  [0.6, 0.576, 0.4],
  [0.6, 1.8, 0.9513764396],
];

describe('high-induction region', () => {
  it('follows Buhl 2005 and Glauert’s curve', () => {
    holds(
      'Glauert',
      largestError(
        TABLE.map(([F, a]) => highInductionThrust('glauert', a, F)),
        TABLE.map((row) => row[2]),
      ),
      1e-8,
    );
    holds(
      'Buhl',
      largestError(
        TABLE.map(([F, a]) => highInductionThrust('buhl', a, F)),
        TABLE.map((row) => row[3]),
      ),
      1e-8,
    );
    holds(
      'Buhl inverse',
      largestError(
        INVERSE.map(([F, ct]) => buhlInduction(ct, F)),
        INVERSE.map((row) => row[2]),
      ),
      1e-9,
    );
  });
  it('comes back to the same induction, also where the textbook quotient vanishes (F = 25/18)', () => {
    const round = [0.3, 0.6, 0.9, 1, 25 / 18].map((F) =>
      Math.abs(buhlInduction(highInductionThrust('buhl', 0.7, F), F) - 0.7),
    );
    holds('round trip', Math.max(...round), 1e-10);
  });
  it.each(['buhl', 'glauert', 'straight-tangent'] as const)(
    '%s: a solved section carries the thrust of the relation',
    (relation) => {
      const polar = compilePolar({ alphaDeg: [-180, 180], cl: [1.2, 1.2], cd: [0, 0] });
      const options = { tipLoss: false, hubLoss: false, dragInInduction: true, highInduction: relation };
      const solidity = 0.014;
      const state = solveSection(
        { solidity, localSpeedRatio: 9, pitchRad: 0, polar, loss: { tip: Infinity, hub: Infinity } },
        options,
      );
      expect(state.status).toBe('converged');
      expect(state.a).toBeGreaterThan(0.4);
      expect(state.a).toBeLessThan(1);
      holds(
        `${relation} annulus`,
        Math.abs(solidity * state.cn * state.speedSquared - highInductionThrust(relation, state.a, 1)),
        1e-9,
      );
    },
  );
});
