import type { Programme, SpecificationIssue } from '@tipward/contract';
import { useSearchParams } from 'react-router-dom';
import { Button } from '../../../../components/ui/button.tsx';
import { EmptyState } from '../../../../components/ui/empty-state.tsx';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { Moment } from '../../../../components/ui/moment.tsx';
import { PageHeader } from '../../../../components/ui/page-header.tsx';
import { useProgramme } from '../../api/get-programme.ts';
import { useSpecifications } from '../../api/list-specifications.ts';
import { IssueForm } from './issue-form.tsx';
import { IssueList } from './issue-list.tsx';
import { IssueView } from './issue-view.tsx';

function Header({
  programme,
  issue,
  onEdit,
}: {
  programme: Programme;
  issue: SpecificationIssue;
  onEdit: (() => void) | null;
}) {
  return (
    <PageHeader
      title={`Specification, issue ${String(issue.issue)}`}
      trail={[
        { label: 'Programmes', to: '/' },
        { label: programme.name, to: `/programmes/${programme.id}` },
      ]}
      state={issue.issue === programme.latestIssue ? null : <span className="text-look">not the latest</span>}
      meta={
        <>
          {issue.issuedBy.name}, <Moment at={issue.issuedAt} exact />.{' '}
          <span className="wrap-anywhere">{issue.note}</span>
        </>
      }
      actions={
        onEdit !== null && (
          <Button kind="primary" onClick={onEdit}>
            Issue anew
          </Button>
        )
      }
    />
  );
}

/** The issue shown and whether it is being edited stand in the address. */
function Specification({
  programme,
  issues,
}: {
  programme: Programme;
  issues: readonly SpecificationIssue[];
}) {
  const [search, setSearch] = useSearchParams();
  const latest = issues[0];
  const asked = Number(search.get('issue') ?? latest?.issue);
  const editing = search.has('edit') && programme.abilities.issueSpecification;
  const issue = editing ? latest : issues.find((one) => one.issue === asked);
  if (latest === undefined || issue === undefined)
    return (
      <EmptyState title={`There is no issue ${search.get('issue') ?? ''}.`}>
        The latest is {latest?.issue}.
      </EmptyState>
    );
  const show = (query: Record<string, string>) => {
    setSearch(query);
  };
  return (
    <div className={editing ? 'mx-auto max-w-5xl' : undefined}>
      <Header
        programme={programme}
        issue={issue}
        onEdit={
          editing || !programme.abilities.issueSpecification
            ? null
            : () => {
                show({ edit: 'yes' });
              }
        }
      />
      {editing ? (
        <IssueForm
          programmeId={programme.id}
          latest={latest}
          onDone={() => {
            show({});
          }}
        />
      ) : (
        <>
          {issues.length > 1 && <IssueList issues={issues} shown={issue.issue} />}
          <IssueView issue={issue} before={issues.find((one) => one.issue === issue.issue - 1)} />
        </>
      )}
    </div>
  );
}

export function SpecificationPage({ programmeId }: { programmeId: string }) {
  const programme = useProgramme(programmeId);
  const issues = useSpecifications(programmeId);
  return (
    <Loaded query={programme} what="the programme">
      {(data) => (
        <Loaded query={issues} what="the issues of the specification">
          {({ items }) => <Specification programme={data} issues={items} />}
        </Loaded>
      )}
    </Loaded>
  );
}
