import type { Membership, Person } from '@tipward/contract';

/** '' stands for no role. */
export const ROLE_OPTIONS = [
  { value: '', label: 'no role' },
  { value: 'reader', label: 'reader' },
  { value: 'aerodynamicist', label: 'aerodynamicist' },
  { value: 'lead', label: 'lead' },
] as const;

export const roleText = (memberships: readonly Membership[]): string =>
  memberships.map(({ programmeName, role }) => `${programmeName}: ${role}`).join('; ');

export const STATUS_WORDS: Record<Person['status'], string> = {
  active: 'active',
  invited: 'invited, not yet here',
  disabled: 'disabled',
};
