import type { Session } from '@tipward/contract';

/** Whoever designs anywhere may add to the library. The API holds to it; here it only spares a dead button. */
export const mayAddAirfoil = (session: Session | undefined): boolean =>
  session?.person?.memberships.some(({ role }) => role !== 'reader') ?? false;
