import { listDesigns, listDrafts, listProgrammes } from '@tipward/contract';
import { useQueries, useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';
import type { Destination } from './match-destinations.ts';

interface Rights {
  readonly isAdministrator: boolean;
  readonly canCreateProgramme: boolean;
}

function pagesFor({ isAdministrator, canCreateProgramme }: Rights): Destination[] {
  const page = (to: string, name: string): Destination => ({ to, name, kind: 'page' });
  return [
    page('/', 'Programmes'),
    page('/airfoils', 'Airfoils'),
    ...(canCreateProgramme ? [page('/programmes/new', 'New programme')] : []),
    ...(isAdministrator ? [page('/people', 'People'), page('/audit', 'Audit')] : []),
    page('/account', 'Account'),
  ];
}

/** Every place this person can go to: programmes, the designs they may see, their drafts, and pages. */
export function useDestinations(rights: Rights): { destinations: Destination[]; loading: boolean } {
  const programmes = useQuery(apiQuery(listProgrammes, {}));
  const drafts = useQuery(apiQuery(listDrafts, {}));
  const items = programmes.data?.items ?? [];
  // A reader sees no designs: asking for them would only be refused.
  const working = items.filter(
    (programme) => programme.role === 'aerodynamicist' || programme.role === 'lead',
  );
  const designs = useQueries({
    queries: working.map((programme) => apiQuery(listDesigns, { params: { programmeId: programme.id } })),
  });
  const destinations: Destination[] = [
    ...items.flatMap((programme): Destination[] => [
      { to: `/programmes/${programme.id}`, name: programme.name, kind: 'programme' },
      {
        to: `/programmes/${programme.id}/specification`,
        name: `${programme.name}, specification`,
        kind: 'specification',
      },
    ]),
    ...designs.flatMap((query, i) =>
      (query.data?.items ?? []).map((design): Destination => ({
        to: `/designs/${design.id}`,
        name: design.name,
        kind: `design of ${working[i]?.name ?? ''}`,
      })),
    ),
    ...(drafts.data?.items ?? []).map((draft): Destination => ({
      to: `/drafts/${draft.id}`,
      name: draft.designName,
      kind: `draft${draft.parentLabel === null ? '' : ` from ${draft.parentLabel}`}`,
    })),
    ...pagesFor(rights),
  ];
  return { destinations, loading: programmes.isPending || designs.some((query) => query.isPending) };
}
