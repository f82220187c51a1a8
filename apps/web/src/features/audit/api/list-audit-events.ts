import { listAuditEvents } from '@tipward/contract';
import type { AuditEvent } from '@tipward/contract';
import { useInfiniteQuery } from '@tanstack/react-query';
import { queryKeyOf } from '../../../lib/api/api-query.ts';
import { callApi } from '../../../lib/api/call-api.ts';

export interface AuditFilter {
  readonly action: string;
  readonly actorId: string;
  readonly programmeId: string;
}

const given = (text: string) => (text === '' ? undefined : text);

function readPage(filter: AuditFilter, cursor: string | undefined, limit: number, signal?: AbortSignal) {
  const { action, actorId, programmeId } = filter;
  return callApi(listAuditEvents, {
    query: { action: given(action), actorId: given(actorId), programmeId: given(programmeId), cursor, limit },
    ...(signal === undefined ? {} : { signal }),
  });
}

/** Events page by page, newest first. */
export const useAuditEvents = (filter: AuditFilter) =>
  useInfiniteQuery({
    queryKey: queryKeyOf(listAuditEvents, { query: filter }),
    queryFn: ({ pageParam, signal }) => readPage(filter, pageParam, 50, signal),
    initialPageParam: undefined as string | undefined,
    getNextPageParam: (page) => page.nextCursor ?? undefined,
  });

/** All events of a filter, for the CSV. */
export async function readAllEvents(filter: AuditFilter): Promise<AuditEvent[]> {
  const events: AuditEvent[] = [];
  let cursor: string | undefined;
  do {
    const page = await readPage(filter, cursor, 200);
    events.push(...page.items);
    cursor = page.nextCursor ?? undefined;
  } while (cursor !== undefined);
  return events;
}
