import { expect } from 'vitest';

/** Prints error against tolerance beside its source, then holds it. */
export function holds(what: string, error: number, tolerance: number): void {
  console.log(`${what}: error ${error.toExponential(2)} of ${tolerance.toExponential(0)} allowed`);
  expect(error, what).toBeLessThanOrEqual(tolerance);
}

/** Largest absolute error of computed against published values. */
export function largestError(computed: readonly number[], published: readonly number[]): number {
  expect(computed).toHaveLength(published.length);
  return Math.max(...computed.map((value, i) => Math.abs(value - (published[i] ?? NaN))));
}
