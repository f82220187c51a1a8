import { useState } from 'react';
import type { ReactNode } from 'react';
import { csvOf } from '../../../lib/files/csv.ts';
import { saveCsv } from '../../../lib/files/save-file.ts';
import { filterRows, sortRows } from './arrange-rows.ts';
import type { Column, SortState } from './column.ts';
import { TableBody } from './table-body.tsx';
import { TableHead } from './table-head.tsx';
import { TableTools } from './table-tools.tsx';

export interface DataTableProps<Row> {
  /** Names the table for those who hear it, and the CSV file. */
  label: string;
  rows: readonly Row[];
  columns: readonly Column<Row>[];
  rowKey: (row: Row) => string;
  initialSort?: SortState | undefined;
  /** Shown instead of the table when there are no rows at all. */
  empty: ReactNode;
  /** Filter and CSV appear above so many rows (6); 0 always, Infinity never. */
  toolsFrom?: number | undefined;
  /** Beside the filter. */
  tools?: ReactNode;
  /** The table scrolls inside this height (CSS length), its head staying in sight. */
  maxHeight?: string | undefined;
}

/** A list that sorts, filters and leaves as CSV, in rows of 28 px. */
export function DataTable<Row>(props: DataTableProps<Row>) {
  const { label, rows, columns, rowKey, initialSort, empty, toolsFrom = 6, tools, maxHeight } = props;
  const [sort, setSort] = useState<SortState | null>(initialSort ?? null);
  const [filter, setFilter] = useState('');
  const shown = sortRows(filterRows(rows, columns, filter), columns, sort);
  const exported = columns.filter((column) => column.text !== undefined);
  const save = () => {
    const header = exported.map((column) =>
      column.unit ? `${column.header} (${column.unit})` : column.header,
    );
    const lines = shown.map((row) => exported.map((column) => column.text?.(row) ?? null));
    saveCsv(csvOf(header, lines), `${label.toLowerCase().replaceAll(/[^\p{L}\p{N}]+/gu, '-')}.csv`);
  };
  if (rows.length === 0) return empty;
  return (
    <div>
      {(rows.length >= toolsFrom || tools !== undefined) && (
        <TableTools
          label={label}
          filter={filter}
          onFilter={setFilter}
          counts={{ shown: shown.length, all: rows.length }}
          onSave={save}
        >
          {tools}
        </TableTools>
      )}
      {/* Scrolls by itself where it is wider than the screen; focusable, so that the keyboard can scroll it. */}
      <div
        role="region"
        aria-label={label}
        tabIndex={0}
        className="overflow-auto"
        style={maxHeight === undefined ? {} : { maxHeight }}
      >
        <table className="w-full border-collapse">
          <caption className="sr-only">{label}</caption>
          <TableHead columns={columns} sort={sort} onSort={setSort} />
          <TableBody rows={shown} columns={columns} rowKey={rowKey} />
        </table>
        {shown.length === 0 && <p className="m-0 px-2 py-4 text-ink-soft">No row holds “{filter}”.</p>}
      </div>
    </div>
  );
}
