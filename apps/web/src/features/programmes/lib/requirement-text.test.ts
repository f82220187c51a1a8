import type { Verdict } from '@tipward/contract';
import { expect, it } from 'vitest';
import { limitText, verdictOn } from './requirement-text.ts';

const verdict: Verdict = {
  kind: 'max-chord',
  label: 'Largest chord',
  unit: 'm',
  bound: 'upper',
  limit: 0.8,
  value: 0.79,
  margin: 0.01,
  verdict: 'holds',
  at: null,
  reason: '',
};

it('writes limits in the decimals of their quantity', () => {
  expect(limitText({ kind: 'max-chord', limit: 0.8 })).toBe('≤ 0.800');
  expect(limitText({ kind: 'min-cp', limit: 0.45 })).toBe('≥ 0.4500');
});

it('tells a verdict that was held against another limit', () => {
  expect(verdictOn('max-chord', 0.8, [verdict])).toEqual({ verdict, otherLimit: false });
  expect(verdictOn('max-chord', 0.75, [verdict])?.otherLimit).toBe(true);
  expect(verdictOn('min-cp', 0.45, [verdict])).toBeNull();
});
