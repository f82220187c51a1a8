import { describe, expect, it } from 'vitest';
import { compilePolar } from '../airfoil/polar.ts';
import type { Polar } from '../airfoil/polar.ts';
import { seeded } from '../numerics/seeded.ts';
import type { Balance } from './balance.ts';
import { evaluateBalance, newBalance, setBalance } from './balance.ts';
import { DEFAULT_OPTIONS } from './options.ts';
import type { SectionInput } from './solve-section.ts';
import { solveSection } from './solve-section.ts';

const RAD = Math.PI / 180;
const EPSILON = 1e-6;
const CELLS = 6000;

/** Stall from gentle to abrupt; rows from 5° to 0.25° apart; linear and cubic; one with measurement noise. */
function polar(random: () => number, kind: number): Polar {
  const step = [2, 1, 0.25, 5, 1, 0.5][kind] ?? 1;
  const noise = kind === 5 ? 0.02 : 0;
  const [slope, zero, stall, fall] = [4 + 4 * random(), -6 * random(), 8 + 10 * random(), 0.5 + 6 * random()];
  const alphaDeg = Array.from({ length: Math.round(360 / step) + 1 }, (_, i) => -180 + step * i);
  const plate = (alpha: number) => 1.2 * Math.sin(2 * alpha * RAD);
  const lift = (alpha: number) => {
    const past = Math.abs(alpha) - stall;
    if (past < 0) return slope * Math.sin((alpha - zero) * RAD) + noise * (random() - 0.5);
    const top = slope * Math.sin((Math.sign(alpha) * stall - zero) * RAD);
    const kept = Math.exp(-past / fall);
    return kept * top + (1 - kept) * plate(alpha);
  };
  return compilePolar(
    { alphaDeg, cl: alphaDeg.map(lift), cd: alphaDeg.map((a) => 0.01 + 1.3 * Math.sin(a * RAD) ** 2) },
    { interpolation: kind === 4 ? 'monotone-cubic' : 'linear' },
  );
}

function residual(balance: Balance, lambda: number, phi: number): number {
  balance.phi = phi;
  evaluateBalance(balance);
  return lambda * balance.denominator - balance.numerator;
}

/** Every admissible root of the bracket, by looking at thousands of places: slow, plain, and with no table. */
function everyRoot({ polar: foil, solidity, pitchRad, loss, localSpeedRatio }: SectionInput): number[] {
  const balance = newBalance(foil);
  setBalance(balance, foil, solidity, pitchRad, loss, DEFAULT_OPTIONS);
  const g = (phi: number) => residual(balance, localSpeedRatio, phi);
  const ahead = g(Math.PI / 2) >= 0;
  const [low, high] = !ahead
    ? [Math.PI / 2, Math.PI - EPSILON]
    : g(EPSILON) < 0
      ? [EPSILON, Math.PI / 2]
      : [-Math.PI / 4, -EPSILON];
  const roots: number[] = [];
  for (let i = 0; i < CELLS; i += 1) {
    let a = low + ((high - low) * i) / CELLS;
    let b = low + ((high - low) * (i + 1)) / CELLS;
    const ga = g(a);
    if (ga * g(b) >= 0) continue;
    for (let k = 0; k < 50; k += 1) {
      const middle = 0.5 * (a + b);
      if (g(middle) * ga > 0) a = middle;
      else b = middle;
    }
    g(0.5 * (a + b));
    if (balance.denominator > 0) roots.push(0.5 * (a + b));
  }
  const attack = (phi: number) => {
    const alpha = phi - pitchRad;
    return Math.abs(alpha - 2 * Math.PI * Math.round(alpha / (2 * Math.PI)));
  };
  return roots.sort((p, q) => attack(p) - attack(q));
}

describe('of several roots', () => {
  it('the one of least |α| is taken and the section marked, as an exhaustive search finds', () => {
    const random = seeded(20260201);
    const polars = Array.from({ length: 30 }, (_, i) => polar(random, i % 6));
    let several = 0;
    let worst = 0;
    for (let i = 0; i < 1200; i += 1) {
      const x = 0.06 + 0.935 * random();
      const foil = polars[i % polars.length];
      if (foil === undefined) throw new Error('no polar');
      const section: SectionInput = {
        solidity: i % 2 === 0 ? 1e-4 * 8000 ** random() : 0.1 + 0.7 * random(),
        localSpeedRatio: 0.01 * 3000 ** random(),
        pitchRad: (-20 + 80 * random()) * RAD,
        polar: foil,
        loss: { tip: (1.5 * (1 - x)) / x, hub: (1.5 * (x - 0.05)) / 0.05 },
      };
      const roots = everyRoot(section);
      const state = solveSection(section, DEFAULT_OPTIONS);
      expect(roots.length).toBeGreaterThan(0);
      expect(state.status).toBe('converged');
      expect(state.multipleRoots).toBe(roots.length > 1);
      if (roots.length > 1) several += 1;
      worst = Math.max(worst, Math.abs(state.phi - (roots[0] ?? NaN)));
    }
    console.log(
      `${several} of 1200 sections with several roots; largest difference ${worst.toExponential(1)} rad`,
    );
    expect(several).toBeGreaterThan(5);
    expect(worst).toBeLessThan(1e-10);
  });
});
