import bcrypt from 'bcryptjs';
import { expect, it, vi } from 'vitest';
import type { Context } from '../../context.ts';
import { hashPassword, passwordMatches } from './password.ts';

const at = (passwordCost: number) => ({ config: { passwordCost } }) as Context;

it('knows the right password from a wrong one and from none', async () => {
  const hash = await hashPassword(at(4), 'a long enough password');
  expect(await passwordMatches(at(4), 'a long enough password', hash)).toBe(true);
  expect(await passwordMatches(at(4), 'a long enough passwor', hash)).toBe(false);
  expect(await passwordMatches(at(4), 'a long enough password', null)).toBe(false);
  const full = 'x'.repeat(72);
  expect(await passwordMatches(at(4), full, await hashPassword(at(4), full))).toBe(true);
  expect(await passwordMatches(at(4), `${full}y`, await hashPassword(at(4), full))).toBe(false);
});

it.each([4, 6])(
  'does the same work at cost %i where there is no hash, and makes none first',
  async (cost) => {
    const compare = vi.spyOn(bcrypt, 'compare');
    const hash = vi.spyOn(bcrypt, 'hash');
    try {
      await passwordMatches(at(cost), 'a wrong password', null);
      expect(compare).toHaveBeenCalledTimes(1);
      expect(bcrypt.getRounds(compare.mock.calls[0]?.[1] ?? '')).toBe(cost);
      expect(hash).not.toHaveBeenCalled();
    } finally {
      vi.restoreAllMocks();
    }
  },
);
