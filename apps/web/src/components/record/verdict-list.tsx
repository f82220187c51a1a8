import type { Verdict } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import { VerdictMark } from '../ui/verdict-mark.tsx';

const PLACES = {
  'wind-speed': (value: number) => `${formatQuantity('speedMS', value)} m/s`,
  radius: (value: number) => `r ${formatQuantity('radiusM', value)} m`,
  'tip-speed-ratio': (value: number) => `λ ${formatQuantity('lambda', value)}`,
};

/** CP to four decimals, everything else a requirement limits to three. */
const number = (kind: string, value: number | null) =>
  formatQuantity(kind === 'min-cp' ? 'cp' : 'factor', value);

function Row({ verdict }: { verdict: Verdict }) {
  const { kind, label, unit, bound, limit, value, margin, at, reason } = verdict;
  return (
    <tr className="h-7 border-t border-rule align-baseline">
      <th scope="row" className="text-left font-normal" title={reason}>
        {label}
        {unit !== '' && <span className="text-ink-soft">, {unit}</span>}
        <span className="block text-xs text-ink-soft wrap-anywhere">{reason}</span>
      </th>
      <td>
        <VerdictMark verdict={verdict.verdict} />
      </td>
      <td className="figures text-right">{number(kind, value)}</td>
      <td className="figures text-right whitespace-nowrap text-ink-soft">
        {bound === 'upper' ? '≤ ' : '≥ '}
        {number(kind, limit)}
      </td>
      <td className="figures text-right">{number(kind, margin)}</td>
      <td className="figures text-right whitespace-nowrap">
        {at === null ? '–' : PLACES[at.quantity](at.value)}
      </td>
    </tr>
  );
}

/** Each requirement with value, limit, margin and the place that governs. */
export function VerdictList({ verdicts }: { verdicts: readonly Verdict[] }) {
  if (verdicts.length === 0)
    return <p className="m-0 text-[13px] text-ink-soft">The specification states no requirement.</p>;
  return (
    <div className="overflow-x-auto" role="region" aria-label="Requirements" tabIndex={0}>
      <table className="w-full border-collapse text-[13px] [&_td]:pl-3">
        <thead className="text-ink-soft">
          <tr>
            <th scope="col" className="text-left font-normal">
              Requirement
            </th>
            <th scope="col" className="pl-3 text-left font-normal">
              Verdict
            </th>
            {['Value', 'Limit', 'Margin', 'Governed at'].map((title) => (
              <th key={title} scope="col" className="pl-3 text-right font-normal">
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {verdicts.map((verdict) => (
            <Row key={verdict.kind} verdict={verdict} />
          ))}
        </tbody>
      </table>
    </div>
  );
}
