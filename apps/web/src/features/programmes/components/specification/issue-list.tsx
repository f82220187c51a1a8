import type { SpecificationIssue } from '@tipward/contract';
import { Link } from 'react-router-dom';
import { formatDay } from '../../../../lib/time/format-time.ts';

/** Every issue, newest first; the one shown is marked. */
export function IssueList({ issues, shown }: { issues: readonly SpecificationIssue[]; shown: number }) {
  return (
    <nav aria-label="Issues of the specification">
      <ol className="m-0 mb-6 list-none border-t border-rule p-0" reversed>
        {issues.map((issue) => (
          <li key={issue.issue} className="border-b border-rule">
            <Link
              to={`?issue=${String(issue.issue)}`}
              aria-current={issue.issue === shown ? 'true' : undefined}
              className="flex flex-wrap gap-x-4 border-l-2 border-transparent py-1.5 pl-3 text-ink no-underline hover:bg-panel aria-[current]:border-accent aria-[current]:bg-panel"
            >
              <span className="font-medium">Issue {issue.issue}</span>
              <span className="min-w-0 flex-1 basis-40 wrap-anywhere">{issue.note}</span>
              <span className="text-[13px] text-ink-soft">
                {issue.issuedBy.name}, {formatDay(issue.issuedAt)}
              </span>
            </Link>
          </li>
        ))}
      </ol>
    </nav>
  );
}
