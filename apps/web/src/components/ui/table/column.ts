import type { ReactNode } from 'react';
import type { CsvCell } from '../../../lib/files/csv.ts';

/** One column of a DataTable. */
export interface Column<Row> {
  readonly id: string;
  readonly header: string;
  readonly unit?: string;
  readonly cell: (row: Row) => ReactNode;
  /** What the column is sorted by; without it the column cannot be sorted. Null sorts last. */
  readonly sort?: (row: Row) => string | number | null;
  /** What the filter looks in and the CSV holds; numbers at full precision. Without it the column stays out of both. */
  readonly text?: (row: Row) => CsvCell;
  /** Figures: right-aligned, tabular. */
  readonly numeric?: boolean;
  /** Takes the width the others leave, cut short on one line. */
  readonly fill?: boolean;
  /** Left out on a phone. */
  readonly wideOnly?: boolean;
}

export interface SortState {
  readonly columnId: string;
  readonly descending: boolean;
}
