import { expect, it } from 'vitest';
import type { Context } from '../../context.ts';
import { hashPassword, passwordMatches } from './password.ts';

const at = (passwordCost: number) => ({ config: { passwordCost } }) as Context;

async function fastest(work: () => Promise<unknown>): Promise<number> {
  const times: number[] = [];
  for (let i = 0; i < 5; i += 1) {
    const started = performance.now();
    await work();
    times.push(performance.now() - started);
  }
  return Math.min(...times);
}

it('knows the right password from a wrong one and from none', async () => {
  const hash = await hashPassword(at(4), 'a long enough password');
  expect(await passwordMatches(at(4), 'a long enough password', hash)).toBe(true);
  expect(await passwordMatches(at(4), 'a long enough passwor', hash)).toBe(false);
  expect(await passwordMatches(at(4), 'a long enough password', null)).toBe(false);
  const full = 'x'.repeat(72);
  expect(await passwordMatches(at(4), `${full}y`, await hashPassword(at(4), full))).toBe(false);
});

it('takes as long where there is no hash, from the first time on', async () => {
  const hash = await hashPassword(at(8), 'a long enough password');
  const without = await fastest(() => passwordMatches(at(8), 'a wrong password', null));
  const withHash = await fastest(() => passwordMatches(at(8), 'a wrong password', hash));
  expect(without / withHash).toBeGreaterThan(0.6);
  expect(without / withHash).toBeLessThan(1.7);
});
