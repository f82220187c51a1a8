import type { ReviewSummary } from '@tipward/contract';
import { Link } from 'react-router-dom';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { Moment } from '../../../../components/ui/moment.tsx';
import { Section } from '../../../../components/ui/section.tsx';
import { VerdictCounts } from '../../../../components/ui/verdict-counts.tsx';
import { useReviews } from '../../api/list-reviews.ts';

const WORDS: Record<ReviewSummary['state'], string> = {
  open: 'open',
  approved: 'approved',
  'changes-requested': 'changes requested',
  withdrawn: 'withdrawn',
};

function ReviewLine({ review }: { review: ReviewSummary }) {
  const { version } = review;
  return (
    <li className="flex min-h-9 flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule py-1">
      <Link to={`/reviews/${review.id}`} className="link font-medium">
        {version.designName} {version.label}
      </Link>
      <span className={review.state === 'open' ? 'text-look' : 'text-ink-soft'}>{WORDS[review.state]}</span>
      <VerdictCounts verdicts={version.verdicts} />
      <span className="text-[13px] text-ink-soft">
        asked by {review.askedBy.name} <Moment at={review.askedAt} />
        {review.openComments > 0 && `, ${String(review.openComments)} open comments`}
      </span>
    </li>
  );
}

export function ReviewsSection({ programmeId }: { programmeId: string }) {
  const reviews = useReviews(programmeId);
  return (
    <Section title="Reviews">
      <Loaded query={reviews} what="the reviews">
        {({ items }) =>
          items.length === 0 ? (
            <p className="m-0 py-1 text-ink-soft">No version has been put forward for review.</p>
          ) : (
            <ul className="m-0 list-none p-0">
              {items.map((review) => (
                <ReviewLine key={review.id} review={review} />
              ))}
            </ul>
          )
        }
      </Loaded>
    </Section>
  );
}
