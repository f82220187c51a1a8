import type { PolarData } from '@tipward/contract';
import { describe, expect, it } from 'vitest';
import { polarFacts } from './polar-facts.ts';

/** Thin-airfoil lift, cl = 2π sin α, with constant drag. */
const alphaDeg = Array.from({ length: 41 }, (_, i) => i - 20);
const ideal: PolarData = {
  reynolds: 1e6,
  surfaceState: 'clean',
  source: 'thin-airfoil theory',
  alphaDeg,
  cl: alphaDeg.map((alpha) => 2 * Math.PI * Math.sin((alpha * Math.PI) / 180)),
  cd: alphaDeg.map(() => 0.01),
  measuredFromDeg: null,
  measuredToDeg: null,
};

describe('polarFacts', () => {
  it('finds the slope of thin-airfoil theory and no concern', () => {
    const facts = polarFacts(ideal, 18);
    expect(facts.liftSlopeShare).toBeCloseTo(1, 2);
    expect(facts.concerns).toEqual([]);
    expect(facts.alphaAtMaxClDeg).toBe(20);
    expect(facts.maxGlideRatio).toBeCloseTo((2 * Math.PI * Math.sin(Math.PI / 9)) / 0.01, 6);
  });

  it('tells drag that is not drag, a weak slope, gaps and ends that do not meet', () => {
    const bad: PolarData = {
      ...ideal,
      alphaDeg: [-180, -3, 0, 4, 8, 180],
      cl: [0.3, -0.1, 0, 0.1, 0.2, 0],
      cd: [0.02, 0.01, 0, 0.01, 0.02, 0.02],
    };
    expect(polarFacts(bad, 18).concerns).toEqual([
      'cd is not above 0 at α = 0°.',
      'The lift slope is 26 % of 2π per radian.',
      'A gap of 4.0° begins at α = 0°.',
      'cl does not close at ±180°.',
    ]);
  });

  it('takes the maximum before stall, not the later rise of a flat plate', () => {
    const stalled = alphaDeg.map((alpha) =>
      alpha <= 9 ? 0.1 * alpha : alpha <= 14 ? 0.9 - 0.04 * (alpha - 9) : 0.7 + 0.06 * (alpha - 14),
    );
    const facts = polarFacts({ ...ideal, cl: stalled }, 18);
    expect(facts.alphaAtMaxClDeg).toBe(9);
    expect(facts.maxCl).toBeCloseTo(0.9, 9);
  });

  it('asks no lift of a cylinder', () => {
    expect(polarFacts({ ...ideal, cl: alphaDeg.map(() => 0) }, 100).concerns).toEqual([]);
  });
});
