import type { Review, Version } from '@tipward/contract';
import { KeyNumberTable } from '../../../components/record/key-number-table.tsx';
import { CoefficientPlot } from '../../../components/record/rotor-plots.tsx';
import { SpanPlots } from '../../../components/record/span-plots.tsx';
import { StationList } from '../../../components/record/station-list.tsx';
import { useUrlCursors } from '../../../components/record/use-url-cursors.ts';
import { VerdictList } from '../../../components/record/verdict-list.tsx';
import { Button } from '../../../components/ui/button.tsx';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { Moment } from '../../../components/ui/moment.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import { Section } from '../../../components/ui/section.tsx';
import { StateBadge } from '../../../components/ui/state-badge.tsx';
import { VerdictCounts } from '../../../components/ui/verdict-counts.tsx';
import { useWithdrawReview } from '../api/change-review.ts';
import { useReview, useReviewedVersion } from '../api/get-review.ts';
import { CommentForm } from './comment-form.tsx';
import { CommentList } from './comment-list.tsx';
import { DecisionForm } from './decision-form.tsx';

function Actions({ review }: { review: Review }) {
  const withdraw = useWithdrawReview();
  const { version } = review;
  return (
    <>
      {version.parentId !== null && (
        <ButtonLink to={`/compare?v=${version.parentId}&v=${version.id}`}>
          Compare with {version.parentLabel ?? 'parent'}
        </ButtonLink>
      )}
      <ButtonLink to={`/versions/${version.id}`}>The version</ButtonLink>
      {review.abilities.withdraw && (
        <Button
          busy={withdraw.isPending}
          onClick={() => {
            withdraw.mutate(
              { params: { reviewId: review.id } },
              {
                onError: (error) => {
                  notify.failed('The review could not be withdrawn', error);
                },
              },
            );
          }}
        >
          Take back out of review
        </Button>
      )}
    </>
  );
}

function Decided({ review }: { review: Review }) {
  const { decision, state, abilities } = review;
  if (abilities.decide) return <DecisionForm review={review} />;
  if (decision === null)
    return (
      <p className="m-0 text-[13px] text-ink-soft">
        {state === 'withdrawn' ? 'Withdrawn by its author.' : abilities.whyNotDecide}
      </p>
    );
  return (
    <>
      <p className="m-0">
        <strong>{decision.outcome === 'approved' ? 'Approved' : 'Changes requested'}</strong> by{' '}
        {decision.decidedBy.name}, <Moment at={decision.decidedAt} exact />
      </p>
      {decision.note !== '' && <p className="m-0 whitespace-pre-wrap wrap-anywhere">{decision.note}</p>}
      <p className="figures m-0 text-xs text-ink-soft wrap-anywhere">signed over {decision.contentHash}</p>
    </>
  );
}

function Changes({ review, version, parent }: { review: Review; version: Version; parent: Version | null }) {
  const cursors = useUrlCursors();
  const numbered = [...(parent === null ? [] : [parent]), version];
  const baseId = parent?.id ?? null;
  const items = numbered.map((each, i) => ({
    id: each.id,
    label: each.label,
    content: each.content,
    evaluation: each.evaluation,
    colorIndex: parent === null ? 0 : 1 - i,
  }));
  return (
    <>
      <Section title={parent === null ? 'First version' : `What changed since ${parent.label}`}>
        {review.message !== '' && (
          <blockquote className="m-0 mb-3 border-l-2 border-rule pl-3 whitespace-pre-wrap wrap-anywhere">
            {review.message}
          </blockquote>
        )}
        <ul className="m-0 pl-5">
          {review.changeSummary.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
      </Section>
      <Section title="Requirements" note={<VerdictCounts verdicts={version.verdicts} />}>
        <VerdictList verdicts={version.verdicts} />
      </Section>
      <Section title="Key numbers">
        <KeyNumberTable items={numbered} baseId={baseId} />
      </Section>
      <Section title="Along the span">
        <SpanPlots
          items={items}
          baseId={baseId}
          cursorRadiusM={cursors.radiusM}
          onCursor={cursors.setRadius}
        />
      </Section>
      <Section title="Rotor">
        <CoefficientPlot
          items={items}
          baseId={baseId}
          tipSpeedRatio={cursors.tipSpeedRatio}
          onTipSpeedRatio={cursors.setTipSpeedRatio}
        />
      </Section>
      <Section title="Stations">
        <StationList content={version.content} base={parent?.content} onPick={cursors.setRadius} />
      </Section>
    </>
  );
}

function Body({ review, version }: { review: Review; version: Version }) {
  const parent = useReviewedVersion(version.parentId);
  const cursors = useUrlCursors();
  const radii = version.content.stations.map((station) => station.radiusM);
  return (
    <div className="grid gap-x-8 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
      <div className="order-2 min-w-0 lg:order-1">
        <Changes review={review} version={version} parent={parent.data ?? null} />
      </div>
      <div className="order-1 min-w-0 lg:order-2">
        <Section title="Decision">
          <Decided review={review} />
        </Section>
        <Section
          title="Comments"
          note={review.openComments === 0 ? 'none open' : `${review.openComments} open`}
        >
          <CommentList review={review} onStation={cursors.setRadius} />
          {review.abilities.comment && (
            <div className="no-print mt-3 border-t border-rule pt-3">
              <CommentForm reviewId={review.id} stationRadiiM={radii} nearRadiusM={cursors.radiusM} />
            </div>
          )}
        </Section>
      </div>
    </div>
  );
}

/** May I sign this? */
export function ReviewPage({ reviewId }: { reviewId: string }) {
  const query = useReview(reviewId);
  const version = useReviewedVersion(query.data?.version.id ?? null);
  return (
    <Loaded query={query} what="the review">
      {(review) => (
        <>
          <PageHeader
            title={`Review of ${review.version.designName} ${review.version.label}`}
            trail={[
              { label: review.programmeName, to: `/programmes/${review.programmeId}` },
              { label: review.version.designName, to: `/designs/${review.version.designId}` },
            ]}
            state={<StateBadge state={review.version.state} letter={review.version.release?.letter} />}
            meta={
              <>
                <span className="block text-ink wrap-anywhere">{review.version.note}</span>
                By {review.version.author.name}. Asked by {review.askedBy.name},{' '}
                <Moment at={review.askedAt} />.
              </>
            }
            actions={<Actions review={review} />}
          />
          <Loaded query={version} what="the version">
            {(data) => <Body review={review} version={data} />}
          </Loaded>
        </>
      )}
    </Loaded>
  );
}
