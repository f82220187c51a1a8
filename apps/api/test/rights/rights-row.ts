import type { Operation } from '@tipward/contract';
import type { World } from './world.ts';

/** Everyone the table asks for: without a session, by role in the programme, and signed in without any role. */
export const CALLERS = ['nobody', 'administrator', 'aerodynamicist', 'lead', 'reader', 'outsider'] as const;
export type CallerName = (typeof CALLERS)[number];

/** One request. Whatever a request uses up (an invitation, a draft) it makes anew each time. */
interface RightsRequest {
  readonly params?: Readonly<Record<string, string>>;
  readonly query?: string;
  readonly body?: object;
  readonly ifMatch?: string;
  readonly cookie?: string;
}

/** Which status each caller gets for a request that is right in every other way. */
export interface RightsRow {
  readonly operation: Operation;
  readonly expected: Readonly<Record<CallerName, number>>;
  readonly request: (world: World, caller: CallerName) => Promise<RightsRequest> | RightsRequest;
}

/** Shorthand for the six statuses, in the order of CALLERS. */
export function statuses(
  nobody: number,
  administrator: number,
  aerodynamicist: number,
  lead: number,
  reader: number,
  outsider: number,
): RightsRow['expected'] {
  return { nobody, administrator, aerodynamicist, lead, reader, outsider };
}

export function row(
  operation: Operation,
  expected: RightsRow['expected'],
  request: RightsRow['request'] = () => ({}),
): RightsRow {
  return { operation, expected, request };
}
