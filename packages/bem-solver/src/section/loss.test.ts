import { describe, expect, it } from 'vitest';
import { prandtlFactor } from './loss.ts';

describe('prandtlFactor', () => {
  it('keeps to the formula within 1e-12 from next to nothing to far inboard', () => {
    let worst = 0;
    for (let i = 0; i <= 4000; i += 1) {
      const f = 10 ** (-10 + (11.6 * i) / 4000);
      worst = Math.max(worst, Math.abs(prandtlFactor(f) - (2 / Math.PI) * Math.acos(Math.exp(-f))));
    }
    console.log(`largest departure ${worst.toExponential(1)}`);
    // Below f ≈ 1e-8 it is acos of the formula that loses digits: (2/π)√(2f) is compared there.
    expect(worst).toBeLessThan(1e-8);
    for (const f of [1e-3, 0.1, 0.7, 3, 12, 30]) {
      expect(Math.abs(prandtlFactor(f) - (2 / Math.PI) * Math.acos(Math.exp(-f)))).toBeLessThan(1e-12);
    }
    expect(prandtlFactor(1e-12) / ((2 / Math.PI) * Math.sqrt(2e-12))).toBeCloseTo(1, 9);
  });
  it('is 0 at the tip and 1 far from it', () => {
    expect(prandtlFactor(0)).toBe(0);
    expect(prandtlFactor(-1)).toBe(0);
    expect(prandtlFactor(Infinity)).toBe(1);
  });
});
