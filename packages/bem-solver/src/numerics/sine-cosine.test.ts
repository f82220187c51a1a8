import { expect, it } from 'vitest';
import { sineCosine } from './sine-cosine.ts';

it('keeps to the library within 2e-15 over a whole turn, and to the sign and digits of small angles', () => {
  const at = { phi: NaN, sine: NaN, cosine: NaN };
  let worst = 0;
  for (let i = -20_000; i <= 20_000; i += 1) {
    const phi = (Math.PI * i) / 20_000;
    at.phi = phi;
    sineCosine(at);
    worst = Math.max(worst, Math.abs(at.sine - Math.sin(phi)), Math.abs(at.cosine - Math.cos(phi)));
  }
  console.log(`largest departure ${worst.toExponential(1)}`);
  expect(worst).toBeLessThan(2e-15);
  for (const phi of [1e-12, -3e-6, 2e-3]) {
    at.phi = phi;
    sineCosine(at);
    expect(Math.abs(at.sine / Math.sin(phi) - 1)).toBeLessThan(4e-16);
  }
});
