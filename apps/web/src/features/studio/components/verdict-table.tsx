import type { Evaluation } from '@tipward/contract';
import { useMemo } from 'react';
import { classNames } from '../../../components/ui/class-names.ts';
import { VerdictCounts } from '../../../components/ui/verdict-counts.tsx';
import { VerdictMark } from '../../../components/ui/verdict-mark.tsx';
import type { Latest } from '../../../lib/solver/use-latest.ts';
import type { CursorStore } from '../lib/cursor-store.ts';
import type { VerdictPlace, VerdictRow } from '../lib/verdict-rows.ts';
import { verdictRows } from '../lib/verdict-rows.ts';
import { Pending } from './pending.tsx';

function PlaceButton({ place, cursors }: { place: VerdictPlace; cursors: CursorStore }) {
  return (
    <button
      type="button"
      className="link figures min-h-6 cursor-pointer border-0 bg-transparent p-0 text-xs whitespace-nowrap"
      title={
        place.kind === 'radius'
          ? 'Put the span cursor here'
          : `Put the operating cursor here, λ ${place.tipSpeedRatio.toFixed(2)}`
      }
      onClick={() => {
        if (place.kind === 'radius') cursors.setRadius(place.radiusM);
        else cursors.setTipSpeedRatio(place.tipSpeedRatio);
      }}
    >
      {place.text}
    </button>
  );
}

function Row({ row, cursors }: { row: VerdictRow; cursors: CursorStore }) {
  const { verdict, value, limit, margin, place } = row;
  return (
    <tr className="border-t border-rule align-baseline">
      <th scope="row" className="text-left text-[13px] leading-4 font-normal" title={verdict.reason}>
        {verdict.label}
        {verdict.unit !== '' && <span className="text-ink-soft">{`,\u00a0${verdict.unit}`}</span>}
      </th>
      <td className="text-xs">
        <VerdictMark verdict={verdict.verdict} />
      </td>
      <td data-figure className="figures text-right text-[13px]">
        {value}
      </td>
      <td data-figure className="figures text-right text-xs whitespace-nowrap text-ink-soft">
        {limit}
      </td>
      <td data-figure className="figures text-right text-xs max-sm:hidden">
        {margin}
      </td>
      <td className="text-right">{place !== null && <PlaceButton place={place} cursors={cursors} />}</td>
    </tr>
  );
}

/** Every requirement held against the draft: value, limit, margin and where it governs. */
export function VerdictTable({
  evaluation,
  pendingReason,
  cursors,
}: {
  evaluation: Latest<Evaluation>;
  pendingReason: string;
  cursors: CursorStore;
}) {
  const { output, current, error } = evaluation;
  const rows = useMemo(() => (output === null ? [] : verdictRows(output)), [output]);
  return (
    <section aria-label="Requirements">
      <h2 className="m-0 flex items-baseline gap-3 text-sm font-medium">
        Requirements
        <span className="text-xs font-normal">
          {output !== null && <VerdictCounts verdicts={output.verdicts} />}
        </span>
        {!current && error === null && (
          <span className="animate-appear text-xs font-normal text-ink-soft">{pendingReason}</span>
        )}
      </h2>
      {error !== null && <p className="m-0 text-xs text-fails">Not evaluated: {error}</p>}
      {rows.length > 0 && (
        <Pending current={current} reason={null}>
          <table className="w-full border-collapse [&_td]:pl-2">
            <thead className="text-xs text-ink-soft">
              <tr>
                <th scope="col" className="text-left font-normal">
                  Requirement
                </th>
                <th scope="col" className="pl-2 text-left font-normal">
                  Verdict
                </th>
                {['Value', 'Limit', 'Margin', 'At'].map((title) => (
                  <th
                    key={title}
                    scope="col"
                    className={classNames('text-right font-normal', title === 'Margin' && 'max-sm:hidden')}
                  >
                    {title}
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {rows.map((row) => (
                <Row key={row.verdict.kind} row={row} cursors={cursors} />
              ))}
            </tbody>
          </table>
        </Pending>
      )}
      {output !== null && rows.length === 0 && (
        <p className="m-0 text-xs text-ink-soft">The specification states no requirement.</p>
      )}
    </section>
  );
}
