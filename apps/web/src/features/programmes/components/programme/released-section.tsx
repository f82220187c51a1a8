import type { Programme, ReleaseSummary } from '@tipward/contract';
import { Link } from 'react-router-dom';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { Section } from '../../../../components/ui/section.tsx';
import { StateBadge } from '../../../../components/ui/state-badge.tsx';
import { formatDay } from '../../../../lib/time/format-time.ts';
import { useReleases } from '../../api/list-releases.ts';

function ReleaseLine({ release }: { release: ReleaseSummary }) {
  return (
    <li className="flex min-h-9 flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule py-1">
      <Link to={`/releases/${release.id}`} className="link font-medium">
        Release {release.letter}: {release.designName} {release.versionLabel}
      </Link>
      <StateBadge state={release.state} />
      <span className="text-[13px] text-ink-soft wrap-anywhere">
        {formatDay(release.releasedAt)}, {release.releasedBy.name}. Effective: {release.effectivity}
      </span>
    </li>
  );
}

/** Exactly one release is current; what it superseded stays readable. */
export function ReleasedSection({ programme }: { programme: Programme }) {
  const releases = useReleases(programme.id);
  return (
    <Section title="Released">
      <Loaded query={releases} what="the releases">
        {({ items }) =>
          items.length === 0 ? (
            <p className="m-0 py-1 text-ink-soft">
              Nothing is released. No number of this programme may be built from.
            </p>
          ) : (
            <ul className="m-0 list-none p-0">
              {items.map((release) => (
                <ReleaseLine key={release.id} release={release} />
              ))}
            </ul>
          )
        }
      </Loaded>
    </Section>
  );
}
