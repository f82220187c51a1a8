import { describe, expect, it } from 'vitest';
import { coefficientsAt, compilePolar, lookUp, newCoefficients } from './polar.ts';
import type { PolarTable } from './polar.ts';

const RAD = Math.PI / 180;
const TABLE: PolarTable = {
  alphaDeg: [-170, -20, -5, 0, 8, 15, 16, 40, 120],
  cl: [0.4, -0.9, -0.3, 0.2, 1.1, 1.5, 1.0, 1.1, -0.6],
  cd: [0.1, 0.3, 0.01, 0.008, 0.01, 0.03, 0.12, 0.7, 1.1],
};

describe.each(['linear', 'monotone-cubic'] as const)('a %s polar', (interpolation) => {
  const polar = compilePolar(TABLE, { interpolation });
  it('goes through its rows, on every turn', () => {
    for (const turn of [-2, 0, 1, 5])
      Array.from(TABLE.alphaDeg).forEach((alpha, i) => {
        const { cl, cd } = coefficientsAt(polar, alpha * RAD + 2 * Math.PI * turn);
        expect(cl).toBeCloseTo(TABLE.cl[i] ?? NaN, 12);
        expect(cd).toBeCloseTo(TABLE.cd[i] ?? NaN, 12);
      });
  });
  it('goes on across the seam from the last row to the first a turn later', () => {
    const values = [130, 150, 170, 179.999, -179.999, -175].map(
      (alpha) => coefficientsAt(polar, alpha * RAD).cl,
    );
    expect(values).toEqual(values.toSorted((a, b) => a - b));
    expect(Math.abs((values[3] ?? NaN) - (values[4] ?? NaN))).toBeLessThan(1e-4);
  });
  it('gives the slopes of what it interpolates', () => {
    const at = newCoefficients();
    const h = 1e-6;
    for (const alpha of [-178, -100, -7.3, 3, 11, 15.5, 77, 140]) {
      at.angle = alpha * RAD;
      lookUp(polar, at);
      const rise = (pick: 'cl' | 'cd') =>
        (coefficientsAt(polar, alpha * RAD + h)[pick] - coefficientsAt(polar, alpha * RAD - h)[pick]) /
        (2 * h);
      expect(Math.abs(at.liftSlope - rise('cl'))).toBeLessThan(1e-6 * (1 + Math.abs(at.liftSlope)));
      expect(Math.abs(at.dragSlope - rise('cd'))).toBeLessThan(1e-6 * (1 + Math.abs(at.dragSlope)));
    }
  });
  it('has a node at every row, with the slopes to both sides', () => {
    const { nodes } = polar;
    Array.from(TABLE.alphaDeg).forEach((alpha, i) => {
      const k = nodes.alpha.findIndex((value) => Math.abs(value - alpha * RAD) < 1e-12);
      expect(nodes.cl[k]).toBeCloseTo(TABLE.cl[i] ?? NaN, 12);
    });
    const gaps = nodes.alpha.slice(1).map((value, i) => value - (nodes.alpha[i] ?? NaN));
    expect(Math.max(...gaps)).toBeLessThanOrEqual(3.0001 * RAD);
    const at = newCoefficients();
    nodes.alpha.forEach((alpha, k) => {
      at.angle = alpha - 1e-9;
      lookUp(polar, at);
      expect(at.liftSlope).toBeCloseTo(nodes.clSlopeBefore[k] ?? NaN, 4);
      at.angle = alpha + 1e-9;
      lookUp(polar, at);
      expect(at.dragSlope).toBeCloseTo(nodes.cdSlopeAfter[k] ?? NaN, 4);
    });
  });
});

describe('a wrong table is refused with field and value', () => {
  const row = { alphaDeg: [-10, 0, 10], cl: [-1, 0, 1], cd: [0.01, 0.01, 0.01] };
  it.each([
    ['alphaDeg', { ...row, alphaDeg: [0], cl: [0], cd: [0] }],
    ['cl', { ...row, cl: [0, 1] }],
    ['cd', { ...row, cd: [0, 1, 2, 3] }],
    ['cm', { ...row, cm: [0] }],
    ['alphaDeg[1]', { ...row, alphaDeg: [-10, -10, 10] }],
    ['alphaDeg[2]', { ...row, alphaDeg: [-10, 0, 181] }],
    ['alphaDeg[0]', { ...row, alphaDeg: [NaN, 0, 10] }],
    ['cl[1]', { ...row, cl: [-1, Infinity, 1] }],
    ['cd[2]', { ...row, cd: [0.01, 0.01, NaN] }],
    ['cm[0]', { ...row, cm: [NaN, 0, 0] }],
  ])('%s', (field, table) => {
    expect(() => compilePolar(table)).toThrow(expect.objectContaining({ field, name: 'SolverInputError' }));
  });
});
