import { describe, expect, it } from 'vitest';
import { releaseLetter } from './release-letter.ts';

describe('releaseLetter', () => {
  it.each([
    [1, 'A'],
    [2, 'B'],
    [26, 'Z'],
    [27, 'AA'],
    [52, 'AZ'],
    [53, 'BA'],
    [703, 'AAA'],
  ])('%d is %s', (sequence, letter) => {
    expect(releaseLetter(sequence)).toBe(letter);
  });
});
