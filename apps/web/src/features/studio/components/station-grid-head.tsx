import { STATION_COLUMNS } from '../lib/station-columns.ts';

const WIDTHS: Record<string, string> = {
  radiusM: 'w-[68px]',
  chordM: 'w-[62px]',
  twistDeg: 'w-[62px]',
  thicknessPct: 'w-[58px]',
  airfoil: 'w-[92px]',
};

/** Names and units of the columns; cells carry no units. */
export function StationGridHead() {
  return (
    <thead role="rowgroup" className="sticky top-0 z-20">
      <tr role="row" aria-rowindex={1}>
        {STATION_COLUMNS.map((column, index) => (
          <th
            key={column.field}
            role="columnheader"
            scope="col"
            aria-colindex={index + 1}
            title={column.label}
            className={`h-7 border-r border-b border-rule bg-panel px-1.5 text-xs font-medium whitespace-nowrap ${
              WIDTHS[column.field] ?? ''
            } ${column.field === 'airfoil' ? 'text-left' : 'text-right'} ${index === 0 ? 'sticky left-0 z-30' : ''}`}
          >
            {column.symbol === '' ? column.label : column.symbol}
            <span className="sr-only"> {column.label}</span>
            {column.unit !== '' && <span className="font-normal text-ink-soft">, {column.unit}</span>}
          </th>
        ))}
        <th
          role="columnheader"
          scope="col"
          aria-colindex={STATION_COLUMNS.length + 1}
          className="h-7 min-w-20 border-b border-rule bg-panel px-1.5 text-left text-xs font-medium"
        >
          To look at
        </th>
      </tr>
    </thead>
  );
}
