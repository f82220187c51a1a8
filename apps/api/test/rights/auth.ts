import {
  acceptInvitation,
  changePassword,
  getSession,
  refreshSession,
  requestPasswordReset,
  resetPassword,
  signIn,
  signOut,
  signOutEverywhere,
} from '@tipward/contract';
import { REFRESH_COOKIE } from '../../src/services/auth/session-cookies.ts';
import { startFamily } from '../../src/services/auth/token-families.ts';
import { makePerson, PASSWORD } from '../factories.ts';
import { makeLinkToken } from '../links.ts';
import { row, statuses } from './rights-row.ts';
import type { World } from './world.ts';

const everyone = (status: number) => statuses(status, status, status, status, status, status);
const signedIn = (status: number) => statuses(401, status, status, status, status, status);

async function freshRefreshCookie(world: World): Promise<string> {
  const person = await makePerson(world.api);
  const { pair } = await world.api.context.db.transaction((transaction) =>
    startFamily(world.api.context, transaction, person.id),
  );
  return `${REFRESH_COOKIE}=${pair.refresh}`;
}

export const authRights = [
  row(getSession, everyone(200)),
  row(signIn, everyone(200), async (world) => ({
    body: { email: (await makePerson(world.api)).email, password: PASSWORD },
  })),
  row(refreshSession, everyone(200), async (world) => ({ cookie: await freshRefreshCookie(world) })),
  row(signOut, signedIn(204)),
  row(signOutEverywhere, signedIn(204)),
  row(changePassword, signedIn(204), () => ({ body: { currentPassword: PASSWORD, newPassword: PASSWORD } })),
  row(requestPasswordReset, everyone(202), async (world) => ({
    body: { email: (await makePerson(world.api)).email },
  })),
  row(resetPassword, everyone(204), async (world) => ({
    body: {
      token: await makeLinkToken(world.api, await makePerson(world.api), 'password-reset'),
      password: PASSWORD,
    },
  })),
  row(acceptInvitation, everyone(200), async (world) => ({
    body: {
      token: await makeLinkToken(
        world.api,
        await makePerson(world.api, { withPassword: false }),
        'invitation',
      ),
      name: 'Newcomer',
      password: PASSWORD,
    },
  })),
];
