import type { Column, SortState } from './column.ts';

const collator = new Intl.Collator('en-GB', { numeric: true, sensitivity: 'base' });

function compare(left: string | number | null, right: string | number | null): number {
  if (typeof left === 'number' && typeof right === 'number') return left - right;
  return collator.compare(String(left), String(right));
}

/** Rows that hold every word of the filter in some column. */
export function filterRows<Row>(
  rows: readonly Row[],
  columns: readonly Column<Row>[],
  filter: string,
): Row[] {
  const words = filter.toLowerCase().split(/\s+/u).filter(Boolean);
  return rows.filter((row) => {
    const text = columns
      .map((column) => String(column.text?.(row) ?? ''))
      .join('\n')
      .toLowerCase();
    return words.every((word) => text.includes(word));
  });
}

/** Rows by one column; those without a value stay last in both directions, ties keep their order. */
export function sortRows<Row>(
  rows: readonly Row[],
  columns: readonly Column<Row>[],
  sort: SortState | null,
): Row[] {
  const value = columns.find((column) => column.id === sort?.columnId)?.sort;
  if (value === undefined || sort === null) return [...rows];
  return rows.toSorted((a, b) => {
    const [left, right] = [value(a), value(b)];
    if (left === null || right === null) return Number(left === null) - Number(right === null);
    return sort.descending ? compare(right, left) : compare(left, right);
  });
}
