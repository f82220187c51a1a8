import type { DraftStation } from '@tipward/contract';
import { memo } from 'react';
import { classNames } from '../../../components/ui/class-names.ts';
import type { RowNotes } from '../lib/row-notes.ts';
import { notesText } from '../lib/row-notes.ts';
import { STATION_COLUMNS } from '../lib/station-columns.ts';
import type { CellEditing } from './station-cell.tsx';
import { StationCell } from './station-cell.tsx';

export interface StationRowProps {
  readonly gridId: string;
  readonly station: DraftStation;
  readonly row: number;
  /** Column of the active cell, −1 when it is in another row. */
  readonly activeColumn: number;
  /** First and last selected column, −1 when the row is outside the range. */
  readonly selectedFrom: number;
  readonly selectedTo: number;
  readonly notes: RowNotes | undefined;
  /** The same station of the reference: what differs is marked. */
  readonly reference: DraftStation | undefined;
  readonly nearCursor: boolean;
  readonly editing: CellEditing | null;
}

const sameNotes = (a: RowNotes | undefined, b: RowNotes | undefined) =>
  a === b || JSON.stringify(a) === JSON.stringify(b);

/** One station. Drawn again only when something in it changed, so that 200 of them do not slow a key down. */
export const StationRow = memo(
  function StationRow(props: StationRowProps) {
    const { gridId, station, row, activeColumn, selectedFrom, selectedTo, notes, reference, editing } = props;
    const text = notesText(notes);
    const failing = notes !== undefined && Object.keys(notes.faults).length > 0;
    return (
      <tr role="row" aria-rowindex={row + 2}>
        {STATION_COLUMNS.map((column, index) => (
          <StationCell
            key={column.field}
            id={`${gridId}-${row}-${index}`}
            station={station}
            column={column}
            columnIndex={index}
            row={row}
            active={index === activeColumn}
            selected={index >= selectedFrom && index <= selectedTo}
            fault={notes?.faults[column.field]}
            changed={reference !== undefined && reference[column.field] !== station[column.field]}
            nearCursor={index === 0 && props.nearCursor}
            editing={index === activeColumn ? editing : null}
          />
        ))}
        <td
          role="gridcell"
          aria-colindex={STATION_COLUMNS.length + 1}
          title={text === '' ? undefined : text}
          className={classNames(
            'h-7 max-w-0 truncate border-b border-rule bg-sheet px-1.5 text-xs',
            failing ? 'text-fails' : 'text-look',
          )}
        >
          {text !== '' && (
            <>
              <span aria-hidden="true">{failing ? '✕ ' : '▲ '}</span>
              <span className="sr-only">{failing ? 'Fault: ' : 'Warning: '}</span>
              {text}
            </>
          )}
        </td>
      </tr>
    );
  },
  (before, after) =>
    sameNotes(before.notes, after.notes) &&
    (Object.keys(after) as (keyof StationRowProps)[]).every(
      (key) => key === 'notes' || before[key] === after[key],
    ),
);
