import { classNames } from '../../../components/ui/class-names.ts';
import { SET_BACK } from './pending.tsx';
import type { HeadlineNumber } from '../lib/headline-numbers.ts';

/** The few numbers an edit is judged by, each beside what it was. */
export function HeadlineTable({
  numbers,
  referenceLabel,
  unlike,
}: {
  numbers: readonly HeadlineNumber[];
  referenceLabel: string | null;
  unlike: readonly string[];
}) {
  return (
    <div>
      <table className="w-full border-collapse" aria-label="Headline numbers">
        <thead className="text-xs text-ink-soft">
          <tr>
            <th scope="col" className="text-left font-normal">
              Number
            </th>
            <th scope="col" className="text-right font-normal">
              draft
            </th>
            <th scope="col" colSpan={2} className="text-right font-normal">
              {referenceLabel === null ? 'no reference' : `Δ against ${referenceLabel}`}
            </th>
          </tr>
        </thead>
        <tbody>
          {numbers.map((row) => (
            <tr key={row.id} className="border-t border-rule" data-number={row.id}>
              <th scope="row" className="text-left text-[13px] font-normal">
                {row.label}
                {row.unit !== '' && <span className="text-ink-soft">, {row.unit}</span>}
              </th>
              <td
                data-current={row.current}
                title={row.value === '–' ? 'Not solved yet, or without a solution' : undefined}
                className={classNames('figures text-right text-[13px] font-medium', !row.current && SET_BACK)}
              >
                {row.value}
                {!row.current && <span className="sr-only"> (solving)</span>}
              </td>
              <td className={classNames('figures pl-3 text-right text-[13px]', !row.current && SET_BACK)}>
                {row.difference}
              </td>
              <td
                className={classNames(
                  'figures w-[76px] text-right text-xs text-ink-soft',
                  !row.current && SET_BACK,
                )}
              >
                {row.share}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {unlike.length > 0 && (
        <p className="m-0 mt-1 border-l-2 border-look bg-look-wash px-2 py-0.5 text-xs">
          <span className="font-medium">Not like for like.</span> {unlike.join(' · ')}
        </p>
      )}
    </div>
  );
}
