import { Link } from 'react-router-dom';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { Moment } from '../../../../components/ui/moment.tsx';
import { Section } from '../../../../components/ui/section.tsx';
import { DraftBadge } from '../../../../components/ui/state-badge.tsx';
import { useDrafts } from '../../api/list-drafts.ts';

/** Where this person left off; only they can see it. */
export function OpenDrafts() {
  const drafts = useDrafts();
  return (
    <Section title="Your open drafts" note="Nobody else sees them.">
      <Loaded query={drafts} what="your drafts">
        {({ items }) =>
          items.length === 0 ? (
            <p className="m-0 py-1 text-ink-soft">
              None. A draft opens from a design: ‘New design’ on a programme, or ‘Open’ beside a version.
            </p>
          ) : (
            <ul className="m-0 list-none p-0">
              {items.map((draft) => (
                <li
                  key={draft.id}
                  className="flex min-h-9 flex-wrap items-center gap-x-4 border-b border-rule py-1"
                >
                  <Link to={`/drafts/${draft.id}`} className="link font-medium">
                    {draft.designName}
                  </Link>
                  <DraftBadge />
                  <span className="text-[13px] text-ink-soft">
                    {draft.parentLabel === null ? 'a first draft' : `from ${draft.parentLabel}`},{' '}
                    {draft.programmeName}, edited <Moment at={draft.updatedAt} />
                  </span>
                </li>
              ))}
            </ul>
          )
        }
      </Loaded>
    </Section>
  );
}
