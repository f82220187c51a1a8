import { expect, it } from 'vitest';
import { safeNext } from './safe-next.ts';

it.each([
  [null, '/'],
  ['', '/'],
  ['/designs/1?at=2#x', '/designs/1?at=2#x'],
  ['https://elsewhere.example', '/'],
  ['//elsewhere.example', '/'],
  ['/\\elsewhere.example', '/'],
  ['javascript:alert(1)', '/'],
])('leads %s to %s', (given, expected) => {
  expect(safeNext(given)).toBe(expected);
});
