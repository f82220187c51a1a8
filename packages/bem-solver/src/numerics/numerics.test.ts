import { describe, expect, it } from 'vitest';
import { brentMaximum } from './maximum.ts';
import { pchipAt, pchipSlopes } from './pchip.ts';
import { brent } from './root.ts';
import { seeded } from './seeded.ts';

describe('brent', () => {
  it.each([
    ['cos x = x', (x: number) => Math.cos(x) - x, 0, 1, 0.7390851332151607],
    ['x³', (x: number) => x ** 3 - 2, -3, 5, Math.cbrt(2)],
    ['flat', (x: number) => (x - 0.3) ** 9, -1, 2, 0.3],
    ['a step', (x: number) => (x < 0.25 ? -1 : 2), 0, 1, 0.25],
  ])('finds the root of %s', (name, f, a, b, root) => {
    const found = brent(f, a, b);
    expect(found.status).toBe('converged');
    // Ninth powers are 0 in rounding over a stretch about the root.
    expect(Math.abs(found.x - root)).toBeLessThan(name === 'flat' ? 1e-2 : 1e-13);
  });
  it('says where there is no sign change', () => {
    expect(brent((x) => x * x + 1, -1, 1).status).toBe('no-sign-change');
  });
});

describe('brentMaximum', () => {
  it('finds a maximum inside and at an end', () => {
    expect(brentMaximum((x) => -((x - 1.3) ** 2), 0, 4, 1e-8).x).toBeCloseTo(1.3, 7);
    expect(brentMaximum((x) => x, 0, 4, 1e-8).x).toBeCloseTo(4, 6);
  });
});

describe('the monotone cubic', () => {
  it('goes through its points and never beyond their range between two of them', () => {
    const random = seeded(11);
    for (let run = 0; run < 200; run += 1) {
      const x = [0];
      const y = [random()];
      for (let i = 1; i < 8; i += 1) {
        x.push((x[i - 1] ?? 0) + 0.05 + random());
        y.push(random() < 0.3 ? (y[i - 1] ?? 0) : random());
      }
      const slopes = pchipSlopes(x, y);
      for (let i = 0; i < 7; i += 1) {
        const [y0, y1] = [y[i] ?? 0, y[i + 1] ?? 0];
        expect(pchipAt(x, y, slopes, x[i] ?? 0)).toBeCloseTo(y0, 12);
        for (let t = 0.05; t < 1; t += 0.1) {
          const at = pchipAt(x, y, slopes, (x[i] ?? 0) + t * ((x[i + 1] ?? 0) - (x[i] ?? 0)));
          expect(at).toBeGreaterThanOrEqual(Math.min(y0, y1) - 1e-12);
          expect(at).toBeLessThanOrEqual(Math.max(y0, y1) + 1e-12);
        }
      }
    }
  });
  it('reproduces a straight line and holds its ends outside', () => {
    const slopes = pchipSlopes([0, 1, 3], [1, 2, 4]);
    expect(pchipAt([0, 1, 3], [1, 2, 4], slopes, 2.2)).toBeCloseTo(3.2, 12);
    expect(pchipAt([0, 1, 3], [1, 2, 4], slopes, -5)).toBe(1);
    expect(pchipAt([0, 1, 3], [1, 2, 4], slopes, 9)).toBe(4);
  });
});
