import type { KeyboardEvent } from 'react';
import { classNames } from '../class-names.ts';
import type { Column } from './column.ts';

const FOCUSABLE = 'a[href], button, input, select';

/** Arrow up and down move from row to row, staying in the column of controls where the focus is. */
function moveBetweenRows(event: KeyboardEvent<HTMLTableSectionElement>): void {
  if (event.key !== 'ArrowDown' && event.key !== 'ArrowUp') return;
  if (!(event.target instanceof HTMLElement) || event.target.matches('select')) return;
  const row = event.target.closest('tr');
  const next = event.key === 'ArrowDown' ? row?.nextElementSibling : row?.previousElementSibling;
  if (!row || !next) return;
  const place = [...row.querySelectorAll(FOCUSABLE)].indexOf(event.target);
  const controls = [...next.querySelectorAll<HTMLElement>(FOCUSABLE)];
  const target = controls[Math.min(place, controls.length - 1)];
  if (target === undefined) return;
  event.preventDefault();
  target.focus();
}

export function TableBody<Row>({
  rows,
  columns,
  rowKey,
}: {
  rows: readonly Row[];
  columns: readonly Column<Row>[];
  rowKey: (row: Row) => string;
}) {
  return (
    <tbody onKeyDown={moveBetweenRows}>
      {rows.map((row) => (
        <tr key={rowKey(row)} className="h-7 border-b border-rule hover:bg-panel focus-within:bg-panel">
          {columns.map((column) => (
            <td
              key={column.id}
              className={classNames(
                'px-2 py-0.5',
                column.numeric === true && 'figures text-right whitespace-nowrap',
                column.fill === true && 'w-full max-w-0 min-w-32 truncate',
                column.wideOnly === true && 'max-sm:hidden',
              )}
            >
              {column.cell(row)}
            </td>
          ))}
        </tr>
      ))}
    </tbody>
  );
}
