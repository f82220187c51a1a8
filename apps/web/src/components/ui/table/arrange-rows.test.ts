import { describe, expect, it } from 'vitest';
import { filterRows, sortRows } from './arrange-rows.ts';
import type { Column } from './column.ts';

interface Row {
  name: string;
  cp: number | null;
}
const rows: Row[] = [
  { name: 'v10', cp: 0.46 },
  { name: 'v2', cp: null },
  { name: 'V1', cp: 0.47 },
];
const columns: Column<Row>[] = [
  {
    id: 'name',
    header: 'Version',
    cell: (row) => row.name,
    sort: (row) => row.name,
    text: (row) => row.name,
  },
  { id: 'cp', header: 'CP', cell: (row) => row.cp, sort: (row) => row.cp, text: (row) => row.cp },
];
const names = (list: Row[]) => list.map((row) => row.name);

describe('sortRows', () => {
  it('orders v2 before v10', () => {
    expect(names(sortRows(rows, columns, { columnId: 'name', descending: false }))).toEqual([
      'V1',
      'v2',
      'v10',
    ]);
  });

  it('keeps rows without a value last in both directions', () => {
    expect(names(sortRows(rows, columns, { columnId: 'cp', descending: false }))).toEqual([
      'v10',
      'V1',
      'v2',
    ]);
    expect(names(sortRows(rows, columns, { columnId: 'cp', descending: true }))).toEqual(['V1', 'v10', 'v2']);
  });

  it('leaves the order alone without a sort, and the given rows untouched', () => {
    expect(names(sortRows(rows, columns, null))).toEqual(['v10', 'v2', 'V1']);
    expect(names(rows)).toEqual(['v10', 'v2', 'V1']);
  });
});

describe('filterRows', () => {
  it('wants every word somewhere in the row, whatever the case', () => {
    expect(names(filterRows(rows, columns, 'v1 0.47'))).toEqual(['V1']);
    expect(names(filterRows(rows, columns, ' V '))).toEqual(['v10', 'v2', 'V1']);
    expect(filterRows(rows, columns, 'v9')).toEqual([]);
  });
});
