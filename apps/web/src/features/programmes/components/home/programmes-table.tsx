import type { ProgrammeSummary, Session } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import { Link } from 'react-router-dom';
import { ButtonLink } from '../../../../components/ui/button-link.tsx';
import { EmptyState } from '../../../../components/ui/empty-state.tsx';
import { Moment } from '../../../../components/ui/moment.tsx';
import type { Column } from '../../../../components/ui/table/column.ts';
import { DataTable } from '../../../../components/ui/table/data-table.tsx';
import { formatDay } from '../../../../lib/time/format-time.ts';
import { attentionCount } from '../../lib/waiting.ts';

function CurrentRelease({ release }: { release: ProgrammeSummary['currentRelease'] }) {
  if (release === null) return <span className="text-ink-soft">none yet</span>;
  return (
    <Link to={`/releases/${release.id}`} className="link">
      {release.letter}: {release.designName} {release.versionLabel}, {formatDay(release.releasedAt)}
    </Link>
  );
}

const COLUMNS: Column<ProgrammeSummary>[] = [
  {
    id: 'name',
    header: 'Programme',
    cell: (row) => (
      <Link to={`/programmes/${row.id}`} className="link font-medium wrap-anywhere">
        {row.name}
      </Link>
    ),
    sort: (row) => row.name,
    text: (row) => row.name,
  },
  {
    id: 'waiting',
    header: 'Waits for you',
    numeric: true,
    cell: (row) =>
      attentionCount(row) === 0 ? '–' : <strong className="text-accent">{attentionCount(row)}</strong>,
    sort: (row) => attentionCount(row),
  },
  {
    id: 'release',
    header: 'Current release',
    cell: (row) => <CurrentRelease release={row.currentRelease} />,
    sort: (row) => row.currentRelease?.releasedAt ?? null,
    text: (row) => row.currentRelease?.letter ?? '',
  },
  {
    id: 'power',
    header: 'Rated power',
    unit: 'kW',
    numeric: true,
    wideOnly: true,
    cell: (row) => formatQuantity('powerKW', row.ratedPowerKW),
    sort: (row) => row.ratedPowerKW,
    text: (row) => row.ratedPowerKW,
  },
  {
    id: 'radius',
    header: 'Tip radius',
    unit: 'm',
    numeric: true,
    wideOnly: true,
    cell: (row) => formatQuantity('radiusM', row.tipRadiusM),
    sort: (row) => row.tipRadiusM,
    text: (row) => row.tipRadiusM,
  },
  {
    id: 'class',
    header: 'Wind class',
    wideOnly: true,
    cell: (row) => row.windClass,
    sort: (row) => row.windClass,
    text: (row) => row.windClass,
  },
  {
    id: 'issue',
    header: 'Specification',
    wideOnly: true,
    cell: (row) => (
      <Link to={`/programmes/${row.id}/specification`} className="link">
        issue {row.latestIssue}
      </Link>
    ),
    sort: (row) => row.latestIssue,
    text: (row) => row.latestIssue,
  },
  {
    id: 'role',
    header: 'Your role',
    wideOnly: true,
    cell: (row) => row.role ?? '–',
    sort: (row) => row.role,
    text: (row) => row.role,
  },
  {
    id: 'updated',
    header: 'Changed',
    wideOnly: true,
    cell: (row) => <Moment at={row.updatedAt} />,
    sort: (row) => row.updatedAt,
    text: (row) => row.updatedAt,
  },
];

export function ProgrammesTable({
  programmes,
  session,
}: {
  programmes: readonly ProgrammeSummary[];
  session: Session;
}) {
  return (
    <DataTable
      label="Programmes"
      rows={programmes}
      columns={COLUMNS}
      rowKey={(row) => row.id}
      initialSort={{ columnId: 'waiting', descending: true }}
      empty={
        session.canCreateProgramme ? (
          <EmptyState
            title="There is no programme yet"
            action={
              <ButtonLink to="/programmes/new" kind="primary">
                Create the first programme
              </ButtonLink>
            }
          >
            A programme is one turbine’s rotor: its specification, the designs for it, and what is released.
          </EmptyState>
        ) : (
          <EmptyState title="You belong to no programme yet">
            An administrator gives roles in programmes.
          </EmptyState>
        )
      }
    />
  );
}
