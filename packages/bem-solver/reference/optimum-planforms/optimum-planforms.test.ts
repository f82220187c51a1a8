import { describe, it } from 'vitest';
import { betzSection, schmitzSection } from '../../src/index.ts';
import { holds, largestError } from '../print-error.ts';

/** r/R, chord (m), φ (°): Betz, λ = 7, B = 3, R = 5 m, cl = 1. */
const BETZ: readonly (readonly [number, number, number])[] = [
  [0.1, 1.375629, 43.60282],
  [0.3, 0.603543, 17.61258],
  [0.5, 0.373225, 10.7843],
  [0.7, 0.268905, 7.74777],
  [0.9, 0.209903, 6.04057],
  [1, 0.189112, 5.44033],
];
/** λ, B, r/R, φ (°), c/R: Schmitz, cl = 1. */
const SCHMITZ: readonly (readonly [number, number, number, number, number])[] = [
  [1, 12, 0.95, 30.9792, 0.283819],
  [1, 12, 0.25, 50.6425, 0.191555],
  [6, 3, 0.95, 6.63375, 0.053284],
  [6, 3, 0.35, 16.97556, 0.127756],
  [10, 2, 0.75, 5.0631, 0.036774],
  [10, 2, 0.15, 22.46005, 0.142981],
];
const deg = (rad: number) => (rad * 180) / Math.PI;

describe('optimum planforms', () => {
  it('Betz', () => {
    const input = { bladeCount: 3, tipRadiusM: 5, tipSpeedRatio: 7, lift: 1 };
    const solved = BETZ.map(([x]) => betzSection(input, 5 * x));
    holds(
      'chord',
      largestError(
        solved.map((s) => s.chordM),
        BETZ.map((row) => row[1]),
      ),
      1e-6,
    );
    holds(
      'φ',
      largestError(
        solved.map((s) => deg(s.phi)),
        BETZ.map((row) => row[2]),
      ),
      1e-5,
    );
  });
  it('Schmitz', () => {
    const solved = SCHMITZ.map(([tipSpeedRatio, bladeCount, x]) =>
      schmitzSection({ bladeCount, tipRadiusM: 1, tipSpeedRatio, lift: 1 }, x),
    );
    holds(
      'c/R',
      largestError(
        solved.map((s) => s.chordM),
        SCHMITZ.map((row) => row[4]),
      ),
      1e-6,
    );
    holds(
      'φ',
      largestError(
        solved.map((s) => deg(s.phi)),
        SCHMITZ.map((row) => row[3]),
      ),
      1e-5,
    );
  });
});
