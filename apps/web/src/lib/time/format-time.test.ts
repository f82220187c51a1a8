import { expect, it } from 'vitest';
import { formatAgo } from './format-time.ts';

const now = Date.UTC(2025, 5, 15, 12);
const ago = (seconds: number) => formatAgo(new Date(now - seconds * 1000).toISOString(), now);

it.each([
  [5, 'just now'],
  [-30, 'just now'],
  [60, '1 minute ago'],
  [3 * 3600 + 59, '3 hours ago'],
  [30 * 3600, 'yesterday'],
  [8 * 86_400, '7 Jun 2025'],
])('says %i s ago as %s', (seconds, words) => {
  expect(ago(seconds)).toBe(words);
});
