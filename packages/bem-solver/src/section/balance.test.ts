import { describe, expect, it } from 'vitest';
import { compilePolar } from '../airfoil/polar.ts';
import { seeded } from '../numerics/seeded.ts';
import { evaluateBalance, newBalance, setBalance } from './balance.ts';
import type { Balance } from './balance.ts';
import { HIGH_INDUCTION, resolveOptions } from './options.ts';

const alphaDeg = Array.from({ length: 73 }, (_, i) => -180 + 5 * i);
const polar = compilePolar(
  {
    alphaDeg,
    cl: alphaDeg.map((a) => 1.3 * Math.sin((2 * (a + 2) * Math.PI) / 180)),
    cd: alphaDeg.map((a) => 0.02 + 1.2 * Math.sin((a * Math.PI) / 180) ** 2),
  },
  { interpolation: 'monotone-cubic' },
);

function at(balance: Balance, phi: number): Balance {
  balance.phi = phi;
  evaluateBalance(balance);
  return { ...balance };
}

/** Ning's residual (2014) as published: sinφ/(1 − a) − (cosφ/λr)(1 − κ′), with a by momentum theory. */
function published(b: Balance, lambda: number): number {
  const [s, c] = [Math.sin(b.phi), Math.cos(b.phi)];
  const kappa = (b.sigma * b.cn) / (4 * b.factor * s * s);
  const kappaPrime = (b.sigma * b.ct) / (4 * b.factor * s * c);
  return s / (1 - kappa / (1 + kappa)) - (c / lambda) * (1 - kappaPrime);
}

describe('the balance λr·D = N', () => {
  it('is Ning’s residual times 4F|s|λr in the momentum region', () => {
    const balance = newBalance(polar);
    setBalance(balance, polar, 0.05, 0.1, { tip: 0.3, hub: 4 }, resolveOptions());
    let compared = 0;
    for (let phi = 0.03; phi < 1.5; phi += 0.01) {
      const b = at(balance, phi);
      if ((b.sigma * b.cn) / (4 * b.factor * b.sine ** 2) > 2 / 3) continue;
      compared += 1;
      const lambda = 3.7;
      const own = (lambda * b.denominator - b.numerator) / (4 * b.factor * b.sine * lambda);
      expect(Math.abs(own - published(b, lambda))).toBeLessThan(1e-12);
    }
    expect(compared).toBeGreaterThan(50);
  });

  it.each(HIGH_INDUCTION.flatMap((name) => [[name, true] as const, [name, false] as const]))(
    '%s, drag in the inductions %s: slopes are those of the functions',
    (highInduction, dragInInduction) => {
      const random = seeded(5);
      const balance = newBalance(polar);
      let high = 0;
      for (let i = 0; i < 400; i += 1) {
        const loss = { tip: 2 * random(), hub: 5 * random() };
        setBalance(
          balance,
          polar,
          0.6 * random(),
          0.5 * random(),
          loss,
          resolveOptions({ highInduction, dragInInduction }),
        );
        const phi = random() < 0.3 ? -0.7 * random() - 0.01 : 0.02 + 3 * random();
        const h = 1e-6;
        const [low, mid, top] = [at(balance, phi - h), at(balance, phi), at(balance, phi + h)];
        const kappa = (b: Balance) => (b.sigma * b.cn) / (4 * b.factor * b.sine ** 2);
        // Glauert's curve has a flat stretch with two corners; no corner within the difference.
        if (highInduction === 'glauert' && kappa(mid) > 0.6) continue;
        if (kappa(low) > 0.6 && kappa(low) < 0.7) continue;
        if (kappa(mid) > 2 / 3) high += 1;
        for (const [value, slope] of [
          ['numerator', 'numeratorSlope'],
          ['denominator', 'denominatorSlope'],
          ['factor', 'factorSlope'],
          ['cn', 'cnSlope'],
          ['ct', 'ctSlope'],
        ] as const) {
          const difference = (top[value] - low[value]) / (2 * h);
          expect(Math.abs(mid[slope] - difference)).toBeLessThan(2e-4 * (1 + Math.abs(difference)));
        }
      }
      if (highInduction !== 'glauert') expect(high).toBeGreaterThan(20);
    },
  );
});
