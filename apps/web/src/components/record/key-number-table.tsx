import { formatDifference, formatQuantity } from '@tipward/design-model';
import type { KeyNumbers } from '@tipward/contract';
import type { KeyNumberRow } from './key-number-rows.ts';
import { KEY_NUMBER_ROWS, shownNumber } from './key-number-rows.ts';

export interface NumberedItem {
  readonly id: string;
  readonly label: string;
  readonly keyNumbers: KeyNumbers;
}

const NO_VALUE = 'Undefined here: the solver found no complete solution, or the quantity does not occur';

function Difference({ row, value, base }: { row: KeyNumberRow; value: number | null; base: number | null }) {
  if (value === null || base === null) return <td className="figures text-right text-xs">–</td>;
  const percent = base === 0 ? null : (100 * (value - base)) / Math.abs(base);
  return (
    <td className="figures text-right text-xs whitespace-nowrap text-ink-soft">
      {formatDifference(row.kind, value - base)}
      {percent !== null && row.unit !== '%' && ` (${formatDifference('percent', percent)} %)`}
    </td>
  );
}

function Cells({ row, item, base }: { row: KeyNumberRow; item: NumberedItem; base: NumberedItem | null }) {
  const value = shownNumber(item.keyNumbers, row);
  return (
    <>
      <td className="figures text-right" title={value === null ? NO_VALUE : undefined}>
        {formatQuantity(row.kind, value)}
      </td>
      {base !== null && base.id !== item.id && (
        <Difference row={row} value={value} base={shownNumber(base.keyNumbers, row)} />
      )}
    </>
  );
}

/** Key numbers of each item beside each other, with differences from the reference. */
export function KeyNumberTable({ items, baseId }: { items: readonly NumberedItem[]; baseId: string | null }) {
  const base = items.find((item) => item.id === baseId) ?? null;
  return (
    <div className="overflow-x-auto" role="region" aria-label="Key numbers" tabIndex={0}>
      <table className="w-full border-collapse [&_td]:pl-4 [&_th]:pl-4 [&_th:first-child]:pl-0">
        <thead className="text-[13px] text-ink-soft">
          <tr>
            <th scope="col" className="text-left font-normal">
              Number
            </th>
            {items.map((item) => (
              <th
                key={item.id}
                scope="col"
                colSpan={base !== null && base.id !== item.id ? 2 : 1}
                className="text-right font-normal"
              >
                {item.label}
                {base !== null && base.id === item.id && ' (reference)'}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {KEY_NUMBER_ROWS.map((row) => (
            <tr key={row.key} className="h-7 border-t border-rule">
              <th scope="row" className="text-left text-[13px] font-normal">
                {row.label}
                {row.unit !== '' && <span className="text-ink-soft">, {row.unit}</span>}
              </th>
              {items.map((item) => (
                <Cells key={item.id} row={row} item={item} base={base} />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
