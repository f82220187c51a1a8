import { z } from 'zod';

export const ROLES = ['aerodynamicist', 'lead', 'reader'] as const;
export const role = z.enum(ROLES);
export type Role = z.infer<typeof role>;

export const personRef = z.object({ id: z.string(), name: z.string() });
export type PersonRef = z.infer<typeof personRef>;

export const membership = z.object({ programmeId: z.string(), programmeName: z.string(), role });
export type Membership = z.infer<typeof membership>;

export const person = z.object({
  id: z.string(),
  name: z.string(),
  email: z.string(),
  isAdministrator: z.boolean(),
  status: z.enum(['active', 'invited', 'disabled']),
  memberships: z.array(membership),
  lastSeenAt: z.string().nullable(),
});
export type Person = z.infer<typeof person>;
