import { beforeAll, expect, it } from 'vitest';
import { makePerson } from '../../../test/factories.ts';
import { useTestApi } from '../../../test/test-api.ts';
import type { Person } from '../../models/person.ts';
import { RefreshSession } from '../../models/refresh-session.ts';
import { SessionFamily } from '../../models/session-family.ts';
import { forgetOldSessions } from './forget-old-sessions.ts';
import { rotate, startFamily } from './token-families.ts';

const api = useTestApi();
const DAY_MS = 24 * 3600 * 1000;
const ago = (days: number) => new Date(Date.now() - days * DAY_MS);
let person: Person;
beforeAll(async () => {
  person = await makePerson(api());
});

/** A family that was refreshed once, and then moved into the past. */
async function familyOf(createdDays: number, expiredDays: number, endedDays: number | null): Promise<string> {
  const { context } = api();
  return context.db.transaction(async (transaction) => {
    const { familyId, pair } = await startFamily(context, transaction, person.id);
    await rotate(context, transaction, pair.refresh);
    await RefreshSession.update({ expiresAt: ago(expiredDays) }, { where: { familyId }, transaction });
    const ended = endedDays === null ? {} : { endedAt: ago(endedDays), endedReason: 'signed-out' };
    await SessionFamily.update(
      { createdAt: ago(createdDays), ...ended },
      { where: { id: familyId }, transaction },
    );
    return familyId;
  });
}

it('removes sessions that ended or expired long ago, and keeps the others', async () => {
  const gone = [await familyOf(90, -1, 31), await familyOf(60, 46, null)];
  const kept = [await familyOf(90, -1, null), await familyOf(90, -1, 29), await familyOf(60, 29, null)];
  expect(await forgetOldSessions()).toBe(gone.length);
  const left = (await SessionFamily.findAll()).map(({ id }) => id);
  expect(left.toSorted()).toEqual(kept.toSorted());
  expect(await RefreshSession.count()).toBe(2 * kept.length);
});
