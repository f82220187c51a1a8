import type { AuditEvent } from '@tipward/contract';
import { Moment } from '../../../components/ui/moment.tsx';
import type { Column } from '../../../components/ui/table/column.ts';

function Detail({ event }: { event: AuditEvent }) {
  const entries: [string, unknown][] = [
    ...Object.entries(event.detail),
    ['subject id', event.subjectId ?? '–'],
    ['previous hash', event.previousHash],
    ['hash', event.hash],
  ];
  return (
    <details>
      <summary className="figures cursor-pointer text-[13px]">{event.hash.slice(0, 10)}…</summary>
      <dl className="figures m-0 my-1 grid grid-cols-[auto_1fr] gap-x-3 text-[13px] wrap-anywhere">
        {entries.map(([name, value]) => (
          <div key={name} className="contents">
            <dt className="text-ink-soft">{name}</dt>
            <dd className="m-0">{typeof value === 'string' ? value : JSON.stringify(value)}</dd>
          </div>
        ))}
      </dl>
    </details>
  );
}

export const AUDIT_COLUMNS: Column<AuditEvent>[] = [
  { id: 'sequence', header: 'No.', numeric: true, cell: (event) => event.sequence },
  { id: 'at', header: 'When', cell: (event) => <Moment at={event.at} exact /> },
  {
    id: 'actor',
    header: 'Who',
    cell: (event) => event.actor?.name ?? <span title="nobody signed in">–</span>,
  },
  {
    id: 'action',
    header: 'What',
    cell: (event) => <span className="figures text-[13px]">{event.action}</span>,
  },
  { id: 'subject', header: 'Concerns', cell: (event) => event.subjectKind, wideOnly: true },
  { id: 'detail', header: 'Detail and hash', cell: (event) => <Detail event={event} />, wideOnly: true },
];
