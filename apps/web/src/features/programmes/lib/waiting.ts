import type { ProgrammeSummary, ReviewSummary } from '@tipward/contract';

export interface WaitingItem {
  readonly key: string;
  readonly to: string;
  /** What to do: 'Decide the review'. */
  readonly task: string;
  readonly subject: string;
  readonly programmeName: string;
  readonly by: string;
  readonly at: string;
}

interface Reader {
  readonly personId: string;
  /** Programmes in which this person is lead. */
  readonly leads: ReadonlySet<string>;
}

function taskOf(review: ReviewSummary, { personId, leads }: Reader): { task: string; to: string } | null {
  const { version } = review;
  const own = version.author.id === personId;
  const lead = leads.has(review.programmeId);
  if (review.state === 'open' && lead && !own)
    return { task: 'Decide the review', to: `/reviews/${review.id}` };
  if (review.state === 'approved' && version.state === 'approved' && lead && !own)
    return { task: 'Release the approved version', to: `/versions/${version.id}` };
  if (review.state === 'changes-requested' && version.state === 'changes-requested' && own)
    return { task: 'Answer the changes asked for', to: `/reviews/${review.id}` };
  return null;
}

/** What waits for this person, oldest first: somebody has been waiting longest there. */
export function waitingFor(
  personId: string,
  programmes: readonly ProgrammeSummary[],
  reviews: readonly ReviewSummary[],
): WaitingItem[] {
  const leads = new Set(programmes.filter(({ role }) => role === 'lead').map(({ id }) => id));
  return reviews
    .flatMap((review): WaitingItem[] => {
      const task = taskOf(review, { personId, leads });
      if (task === null) return [];
      return [
        {
          ...task,
          key: review.id,
          subject: `${review.version.designName} ${review.version.label}`,
          programmeName: review.programmeName,
          by: review.askedBy.name,
          at: review.askedAt,
        },
      ];
    })
    .toSorted((a, b) => a.at.localeCompare(b.at));
}

/** How many things wait in one programme. */
export const attentionCount = ({ attention }: ProgrammeSummary): number =>
  attention.reviewsToDecide + attention.versionsSentBack + attention.approvedToRelease;
