import type { Verdict } from '@tipward/contract';
import { VerdictMark } from './verdict-mark.tsx';

const ORDER = ['fails', 'unknown', 'holds'] as const;

/** '1 fails · 6 hold': what stands in the way first. */
export function VerdictCounts({ verdicts }: { verdicts: readonly Verdict[] }) {
  if (verdicts.length === 0) return <span className="text-ink-soft">no requirements</span>;
  const counted = ORDER.map((outcome) => ({
    outcome,
    count: verdicts.filter((entry) => entry.verdict === outcome).length,
  })).filter((entry) => entry.count > 0);
  return (
    <span className="inline-flex gap-x-3">
      {counted.map(({ outcome, count }) => {
        const verb = count === 1 || outcome === 'unknown' ? outcome : outcome.slice(0, -1);
        return <VerdictMark key={outcome} verdict={outcome} word={`${String(count)} ${verb}`} />;
      })}
    </span>
  );
}
