import { REQUIREMENT_KINDS, SPECIFICATION_RULES } from '@tipward/contract';
import type { SpecificationIssue } from '@tipward/contract';
import { EmptyState } from '../../../../components/ui/empty-state.tsx';
import { Figure } from '../../../../components/ui/figure.tsx';
import { FigureRow } from '../../../../components/ui/figure-row.tsx';
import { Section } from '../../../../components/ui/section.tsx';
import type { Column } from '../../../../components/ui/table/column.ts';
import { DataTable } from '../../../../components/ui/table/data-table.tsx';
import { limitText } from '../../lib/requirement-text.ts';
import { specificationChanges } from '../../lib/specification-changes.ts';
import { CONTROL_WORDS, FIELD_GROUPS, shownNumber } from '../../lib/specification-fields.ts';

type Requirement = SpecificationIssue['requirements'][number];

const COLUMNS: Column<Requirement>[] = [
  {
    id: 'kind',
    header: 'Requirement',
    cell: ({ kind }) => REQUIREMENT_KINDS[kind].label,
    sort: ({ kind }) => REQUIREMENT_KINDS[kind].label,
    text: ({ kind }) => REQUIREMENT_KINDS[kind].label,
  },
  { id: 'limit', header: 'Limit', numeric: true, cell: limitText, text: ({ limit }) => limit },
  {
    id: 'unit',
    header: 'Unit',
    cell: ({ kind }) => REQUIREMENT_KINDS[kind].unit,
    text: ({ kind }) => REQUIREMENT_KINDS[kind].unit,
  },
  {
    id: 'reason',
    header: 'Reason',
    cell: ({ reason }) => <span className="wrap-anywhere">{reason}</span>,
    text: ({ reason }) => reason,
  },
];

function Words({ title, issue }: { title: string; issue: SpecificationIssue }) {
  const { control, windClass } = issue.specification;
  if (title === 'Control') return <Figure label="Kind" value={CONTROL_WORDS[control]} words />;
  return title === 'Wind' ? <Figure label="IEC class" value={windClass} words /> : null;
}

/** One issue, read-only; what it changed from the issue before is said first and marked. */
export function IssueView({
  issue,
  before,
}: {
  issue: SpecificationIssue;
  before: SpecificationIssue | undefined;
}) {
  const changes = before === undefined ? [] : specificationChanges(before, issue);
  const changeOf = (label: string) => changes.find(({ what }) => what === label);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-x-12 xl:grid-cols-2">
      <div>
        {FIELD_GROUPS.map((group) => (
          <Section key={group.title} title={group.title}>
            <FigureRow>
              <Words title={group.title} issue={issue} />
              {group.fields.map((field) => {
                const { label, unit } = SPECIFICATION_RULES[field];
                const change = changeOf(label);
                return (
                  <Figure
                    key={field}
                    label={label}
                    unit={unit}
                    value={shownNumber(issue.specification[field])}
                    note={
                      change === undefined ? undefined : (
                        <span className="text-look">was {change.before}</span>
                      )
                    }
                  />
                );
              })}
            </FigureRow>
          </Section>
        ))}
      </div>
      <Section title="Requirements">
        <DataTable
          label={`Requirements of issue ${String(issue.issue)}`}
          rows={issue.requirements}
          columns={COLUMNS}
          rowKey={({ kind }) => kind}
          empty={<EmptyState title="This issue sets no requirement." />}
        />
      </Section>
    </div>
  );
}
