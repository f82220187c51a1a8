import type { AirfoilSummary, Session } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import { Link } from 'react-router-dom';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { Moment } from '../../../components/ui/moment.tsx';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { DataTable } from '../../../components/ui/table/data-table.tsx';
import { useSession } from '../../../lib/session/session-query.ts';
import { useAirfoils } from '../api/list-airfoils.ts';
import { mayAddAirfoil } from '../lib/may-add.ts';
import { reynoldsText } from '../lib/polar-series.ts';

const COLUMNS: Column<AirfoilSummary>[] = [
  {
    id: 'name',
    header: 'Airfoil',
    cell: ({ id, name }) => (
      <Link to={`/airfoils/${id}`} className="link font-medium">
        {name}
      </Link>
    ),
    sort: ({ name }) => name,
    text: ({ name }) => name,
  },
  {
    id: 'thickness',
    header: 'Relative thickness',
    unit: '%',
    numeric: true,
    cell: ({ thicknessPct }) => formatQuantity('thicknessPct', thicknessPct),
    sort: ({ thicknessPct }) => thicknessPct,
    text: ({ thicknessPct }) => thicknessPct,
  },
  {
    id: 're',
    header: 'Reynolds numbers',
    cell: ({ reynolds }) => <span className="figures">{reynolds.map(reynoldsText).join(', ')}</span>,
    sort: ({ reynolds }) => Math.max(...reynolds),
    text: ({ reynolds }) => reynolds.join(' '),
  },
  {
    id: 'surface',
    header: 'Surface',
    wideOnly: true,
    cell: ({ surfaceStates }) => surfaceStates.join(', '),
    text: ({ surfaceStates }) => surfaceStates.join(' '),
  },
  {
    id: 'note',
    header: 'Note',
    wideOnly: true,
    fill: true,
    cell: ({ note }) => <span title={note}>{note}</span>,
    text: ({ note }) => note,
  },
  {
    id: 'added',
    header: 'Added',
    wideOnly: true,
    cell: ({ addedBy, addedAt }) => (
      <span className="whitespace-nowrap">
        {addedBy.name} <Moment at={addedAt} />
      </span>
    ),
    sort: ({ addedAt }) => addedAt,
    text: ({ addedBy, addedAt }) => `${addedBy.name} ${addedAt}`,
  },
];

function AddLink({ session }: { session: Session | undefined }) {
  return mayAddAirfoil(session) ? <ButtonLink to="/airfoils/new">Add an airfoil</ButtonLink> : null;
}

export function AirfoilsPage() {
  const airfoils = useAirfoils();
  const session = useSession().data;
  return (
    <>
      <PageHeader
        title="Airfoils"
        meta="Outlines and polars that designs pin by their hash: once added, they never change."
        actions={<AddLink session={session} />}
      />
      <Loaded query={airfoils} what="the airfoils">
        {({ items }) => (
          <DataTable
            label="Airfoils"
            rows={items}
            columns={COLUMNS}
            rowKey={({ id }) => id}
            initialSort={{ columnId: 'thickness', descending: false }}
            toolsFrom={0}
            empty={
              <EmptyState title="The library is empty" action={<AddLink session={session} />}>
                A design needs at least one airfoil with a polar.
              </EmptyState>
            }
          />
        )}
      </Loaded>
    </>
  );
}
