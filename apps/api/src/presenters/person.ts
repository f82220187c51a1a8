import type { Membership, Person } from '@tipward/contract';

export interface PersonRecord {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly isAdministrator: boolean;
  readonly disabledAt: Date | null;
  readonly lastSeenAt: Date | null;
  readonly hasPassword: boolean;
  readonly memberships: readonly Membership[];
}

export function presentPerson(person: PersonRecord): Person {
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    isAdministrator: person.isAdministrator,
    status: person.disabledAt !== null ? 'disabled' : person.hasPassword ? 'active' : 'invited',
    memberships: [...person.memberships],
    lastSeenAt: person.lastSeenAt?.toISOString() ?? null,
  };
}
