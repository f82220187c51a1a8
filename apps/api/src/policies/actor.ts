import type { Role } from '@tipward/contract';

/** Who asks, with the rights they hold at this moment; read anew for every request. */
export interface Actor {
  readonly personId: string;
  readonly name: string;
  readonly email: string;
  readonly isAdministrator: boolean;
  /** Role by programme id. */
  readonly roles: ReadonlyMap<string, Role>;
}
