import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Button } from '../../../components/ui/button.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { Loading } from '../../../components/ui/loading.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import { Problem } from '../../../components/ui/problem.tsx';
import { DataTable } from '../../../components/ui/table/data-table.tsx';
import { saveCsv } from '../../../lib/files/save-file.ts';
import { readAllEvents, useAuditEvents } from '../api/list-audit-events.ts';
import type { AuditFilter } from '../api/list-audit-events.ts';
import { eventsCsv } from '../lib/events-csv.ts';
import { AUDIT_COLUMNS } from './audit-columns.tsx';
import { AuditFilters } from './audit-filters.tsx';
import { Verification } from './verification.tsx';

function SaveAll({ filter }: { filter: AuditFilter }) {
  const [busy, setBusy] = useState(false);
  const save = async () => {
    setBusy(true);
    try {
      saveCsv(eventsCsv(await readAllEvents(filter)), 'audit.csv');
    } catch (error) {
      notify.failed('The audit could not be saved.', error);
    } finally {
      setBusy(false);
    }
  };
  return (
    <Button busy={busy} onClick={() => void save()}>
      Save as CSV
    </Button>
  );
}

function Events({ filter }: { filter: AuditFilter }) {
  const events = useAuditEvents(filter);
  if (events.data === undefined)
    return events.error === null ? (
      <Loading what="the events" />
    ) : (
      <Problem
        error={events.error}
        title="Could not load the events."
        onRetry={() => void events.refetch()}
      />
    );
  return (
    <>
      <DataTable
        label="Audit events"
        rows={events.data.pages.flatMap((page) => page.items)}
        columns={AUDIT_COLUMNS}
        rowKey={(event) => String(event.sequence)}
        toolsFrom={Infinity}
        empty={<EmptyState title="No event fits the filter." />}
      />
      {events.error !== null && <Problem error={events.error} title="Could not load older events." />}
      {events.hasNextPage && (
        <Button className="mt-3" busy={events.isFetchingNextPage} onClick={() => void events.fetchNextPage()}>
          Older events
        </Button>
      )}
    </>
  );
}

/** The filter stands in the address, so that a link shows what its sender saw. */
export function AuditPage() {
  const [search, setSearch] = useSearchParams();
  const filter: AuditFilter = {
    action: search.get('action') ?? '',
    actorId: search.get('actorId') ?? '',
    programmeId: search.get('programmeId') ?? '',
  };
  const change = (name: keyof AuditFilter, value: string) => {
    const next = new URLSearchParams(search);
    if (value === '') next.delete(name);
    else next.set(name, value);
    setSearch(next, { replace: true });
  };
  return (
    <>
      <PageHeader
        title="Audit"
        meta="Who did what and when; each event seals the one before it by its hash"
        actions={<SaveAll filter={filter} />}
      />
      <Verification />
      <div className="mb-4">
        <AuditFilters filter={filter} onChange={change} />
      </div>
      <Events filter={filter} />
    </>
  );
}
