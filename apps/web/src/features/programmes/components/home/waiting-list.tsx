import type { ProgrammeSummary } from '@tipward/contract';
import { Link } from 'react-router-dom';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { Moment } from '../../../../components/ui/moment.tsx';
import { Section } from '../../../../components/ui/section.tsx';
import { useReviews } from '../../api/list-reviews.ts';
import { waitingFor } from '../../lib/waiting.ts';
import type { WaitingItem } from '../../lib/waiting.ts';

function Item({ item }: { item: WaitingItem }) {
  return (
    <li className="flex min-h-9 flex-wrap items-center gap-x-4 border-b border-rule border-l-2 border-l-accent py-1 pl-3">
      <Link to={item.to} className="link font-medium">
        {item.task}: {item.subject}
      </Link>
      <span className="text-[13px] text-ink-soft">
        {item.programmeName}, asked by {item.by} <Moment at={item.at} />
      </span>
    </li>
  );
}

/** Somebody waits for this person: shown before all else. */
export function WaitingList({
  personId,
  programmes,
}: {
  personId: string;
  programmes: readonly ProgrammeSummary[];
}) {
  const reviews = useReviews();
  return (
    <Section title="Waiting for you">
      <Loaded query={reviews} what="what waits for you">
        {({ items }) => {
          const waiting = waitingFor(personId, programmes, items);
          return waiting.length === 0 ? (
            <p className="m-0 py-1 text-ink-soft">Nothing waits for you.</p>
          ) : (
            <ul className="m-0 list-none p-0">
              {waiting.map((item) => (
                <Item key={item.key} item={item} />
              ))}
            </ul>
          );
        }}
      </Loaded>
    </Section>
  );
}
