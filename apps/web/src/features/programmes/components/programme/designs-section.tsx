import type { DesignSummary, Programme } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import { Link } from 'react-router-dom';
import { ButtonLink } from '../../../../components/ui/button-link.tsx';
import { EmptyState } from '../../../../components/ui/empty-state.tsx';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { Moment } from '../../../../components/ui/moment.tsx';
import { Section } from '../../../../components/ui/section.tsx';
import { StateBadge } from '../../../../components/ui/state-badge.tsx';
import type { Column } from '../../../../components/ui/table/column.ts';
import { DataTable } from '../../../../components/ui/table/data-table.tsx';
import { VerdictCounts } from '../../../../components/ui/verdict-counts.tsx';
import { useDesigns } from '../../api/list-designs.ts';

const NONE = <span title="no version saved yet">–</span>;

const COLUMNS: Column<DesignSummary>[] = [
  {
    id: 'name',
    header: 'Design',
    cell: ({ id, name }) => (
      <Link to={`/designs/${id}`} className="link font-medium wrap-anywhere">
        {name}
      </Link>
    ),
    sort: ({ name }) => name,
    text: ({ name }) => name,
  },
  {
    id: 'latest',
    header: 'Latest version',
    cell: ({ latestVersion }) =>
      latestVersion === null ? (
        NONE
      ) : (
        <span className="inline-flex items-center gap-2">
          <Link to={`/versions/${latestVersion.id}`} className="link">
            {latestVersion.label}
          </Link>
          <StateBadge state={latestVersion.state} letter={latestVersion.release?.letter} />
        </span>
      ),
    sort: ({ latestVersion }) => latestVersion?.state ?? null,
    text: ({ latestVersion }) =>
      latestVersion === null ? null : `${latestVersion.label} ${latestVersion.state}`,
  },
  {
    id: 'verdicts',
    header: 'Requirements',
    cell: ({ latestVersion }) =>
      latestVersion === null ? NONE : <VerdictCounts verdicts={latestVersion.verdicts} />,
    sort: ({ latestVersion }) =>
      latestVersion?.verdicts.filter(({ verdict }) => verdict === 'fails').length ?? null,
  },
  {
    id: 'cp',
    header: 'Max CP',
    numeric: true,
    wideOnly: true,
    cell: ({ latestVersion }) => formatQuantity('cp', latestVersion?.keyNumbers.maxCp),
    sort: ({ latestVersion }) => latestVersion?.keyNumbers.maxCp ?? null,
    text: ({ latestVersion }) => latestVersion?.keyNumbers.maxCp ?? null,
  },
  {
    id: 'energy',
    header: 'Energy, net',
    unit: 'MWh',
    numeric: true,
    wideOnly: true,
    cell: ({ latestVersion }) => formatQuantity('energyMWh', latestVersion?.keyNumbers.energyNetMWh),
    sort: ({ latestVersion }) => latestVersion?.keyNumbers.energyNetMWh ?? null,
    text: ({ latestVersion }) => latestVersion?.keyNumbers.energyNetMWh ?? null,
  },
  {
    id: 'author',
    header: 'By',
    wideOnly: true,
    cell: ({ latestVersion, createdBy }) => latestVersion?.author.name ?? createdBy.name,
    text: ({ latestVersion, createdBy }) => latestVersion?.author.name ?? createdBy.name,
  },
  {
    id: 'updated',
    header: 'Changed',
    wideOnly: true,
    cell: ({ updatedAt }) => <Moment at={updatedAt} />,
    sort: ({ updatedAt }) => updatedAt,
    text: ({ updatedAt }) => updatedAt,
  },
];

export function DesignsSection({ programme }: { programme: Programme }) {
  const designs = useDesigns(programme.id, true);
  return (
    <Section title="Designs in work">
      <Loaded query={designs} what="the designs">
        {({ items }) => (
          <DataTable
            label="Designs"
            rows={items}
            columns={COLUMNS}
            rowKey={({ id }) => id}
            initialSort={{ columnId: 'updated', descending: true }}
            empty={
              <EmptyState
                title="No design yet"
                action={
                  programme.abilities.createDesign && (
                    <ButtonLink kind="primary" to={`/programmes/${programme.id}/designs/new`}>
                      Start a design
                    </ButtonLink>
                  )
                }
              >
                A design begins sized from the specification, from stations of a spreadsheet, or from a
                version.
              </EmptyState>
            }
          />
        )}
      </Loaded>
    </Section>
  );
}
