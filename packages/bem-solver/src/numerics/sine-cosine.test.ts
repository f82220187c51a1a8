import { expect, it } from 'vitest';
import { sineCosine } from './sine-cosine.ts';

it('keeps to the library within 2e-15 over a whole turn, and to the sign and digits of small angles', () => {
  const out = new Float64Array(3);
  let worst = 0;
  for (let i = -20_000; i <= 20_000; i += 1) {
    const phi = (Math.PI * i) / 20_000;
    out[0] = phi;
    sineCosine(out, 0, 1);
    const [, sine = NaN, cosine = NaN] = out;
    worst = Math.max(worst, Math.abs(sine - Math.sin(phi)), Math.abs(cosine - Math.cos(phi)));
  }
  console.log(`largest departure ${worst.toExponential(1)}`);
  expect(worst).toBeLessThan(2e-15);
  for (const phi of [1e-12, -3e-6, 2e-3]) {
    out[0] = phi;
    sineCosine(out, 0, 1);
    expect(Math.abs((out[1] ?? NaN) / Math.sin(phi) - 1)).toBeLessThan(4e-16);
  }
});
