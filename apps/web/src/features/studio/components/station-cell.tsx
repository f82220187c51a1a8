import type { DraftStation } from '@tipward/contract';
import type { KeyboardEvent } from 'react';
import { classNames } from '../../../components/ui/class-names.ts';
import type { StationColumn } from '../lib/station-columns.ts';
import { BLENDED, shownCell } from '../lib/station-columns.ts';
import type { CellEdit } from './use-station-grid.ts';

export interface CellEditing {
  readonly edit: CellEdit;
  readonly airfoilNames: readonly string[];
  readonly onChange: (text: string) => void;
  readonly onKeyDown: (event: KeyboardEvent<HTMLElement>) => void;
  readonly onEnd: () => void;
}

const EDITOR =
  'absolute inset-0 z-10 h-full w-full border-0 bg-sheet px-1.5 text-[13px] text-ink outline-2 -outline-offset-2 outline-accent';

function CellEditor({ column, row, editing }: { column: StationColumn; row: number; editing: CellEditing }) {
  const { edit, onChange, onKeyDown, onEnd } = editing;
  const shared = {
    autoFocus: true,
    'aria-label': `${column.label}${column.unit === '' ? '' : `, ${column.unit}`}, station ${row + 1}`,
    onKeyDown,
    onBlur: onEnd,
    value: edit.text,
  };
  if (column.field !== 'airfoil')
    return (
      <input
        {...shared}
        type="text"
        inputMode="decimal"
        autoComplete="off"
        spellCheck={false}
        maxLength={200}
        className={`${EDITOR} figures text-right`}
        onChange={(event) => {
          onChange(event.target.value);
        }}
      />
    );
  // A name that is not among the design's airfoils stays in the list, or the cell would show another.
  const names = [...new Set([BLENDED, ...editing.airfoilNames, edit.text])];
  return (
    <select
      {...shared}
      className={EDITOR}
      onChange={(event) => {
        onChange(event.target.value);
      }}
    >
      {names.map((name) => (
        <option key={name}>{name}</option>
      ))}
    </select>
  );
}

/** One cell. Its place in the table travels in data attributes, so that the table listens once for all cells. */
export function StationCell({
  id,
  station,
  column,
  columnIndex,
  row,
  active,
  selected,
  fault,
  changed,
  nearCursor,
  editing,
}: {
  id: string;
  station: DraftStation;
  column: StationColumn;
  columnIndex: number;
  row: number;
  active: boolean;
  selected: boolean;
  fault: string | undefined;
  /** Differs from the reference. */
  changed: boolean;
  /** The span cursor stands at this station; marked on its first cell. */
  nearCursor: boolean;
  editing: CellEditing | null;
}) {
  const first = columnIndex === 0;
  return (
    <td
      id={id}
      role={first ? 'rowheader' : 'gridcell'}
      aria-colindex={columnIndex + 1}
      aria-selected={selected}
      aria-invalid={fault === undefined ? undefined : true}
      data-row={row}
      data-column={columnIndex}
      title={fault}
      className={classNames(
        'relative h-7 border-r border-b border-rule px-1.5 whitespace-nowrap',
        first && 'sticky left-0 z-[5] font-medium',
        column.field === 'airfoil' ? 'max-w-24 truncate text-[13px]' : 'figures text-right text-[13px]',
        selected ? 'bg-accent-wash' : first ? 'bg-panel' : 'bg-sheet',
        fault !== undefined && 'text-fails underline decoration-wavy decoration-1 underline-offset-2',
        station[column.field] === null && 'text-ink-soft',
        changed && 'font-semibold',
        nearCursor && 'shadow-[inset_4px_0_0_var(--ink)]',
        active && 'outline-2 -outline-offset-2 outline-accent',
      )}
    >
      {shownCell(station, column)}
      {changed && <span className="sr-only"> (changed)</span>}
      {editing !== null && <CellEditor column={column} row={row} editing={editing} />}
    </td>
  );
}
