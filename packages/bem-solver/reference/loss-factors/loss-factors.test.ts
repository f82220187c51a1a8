import { describe, it } from 'vitest';
import { prandtlFactor } from '../../src/index.ts';
import { holds, largestError } from '../print-error.ts';

/** B, r/R, tip factor, hub factor at φ = 10°. */
const TABLE: readonly (readonly [number, number, number, number])[] = [
  [2, 0.2, 1, 0.99799147],
  [2, 0.7, 0.9459814, 1],
  [2, 0.9, 0.6463605, 1],
  [2, 0.99, 0.21504237, 1],
  [3, 0.2, 1, 0.99988718],
  [3, 0.8, 0.92638394, 1],
  [3, 0.9, 0.74980159, 1],
  [3, 0.95, 0.56226668, 1],
  [3, 0.99, 0.26209264, 1],
];

describe('Prandtl 1919', () => {
  it('tip and hub factors', () => {
    const s = Math.sin((10 * Math.PI) / 180);
    const tip = TABLE.map(([B, x]) => prandtlFactor((B * (1 - x)) / (2 * x * s)));
    const hub = TABLE.map(([B, x]) => prandtlFactor((B * (x - 0.1)) / (2 * 0.1 * s)));
    holds(
      'tip',
      largestError(
        tip,
        TABLE.map((row) => row[2]),
      ),
      1e-8,
    );
    holds(
      'hub',
      largestError(
        hub,
        TABLE.map((row) => row[3]),
      ),
      1e-8,
    );
  });
});
