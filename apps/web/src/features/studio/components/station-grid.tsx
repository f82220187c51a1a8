import type { DraftContent, DraftStation } from '@tipward/contract';
import { useEffect, useId, useMemo, useRef } from 'react';
import type { Dispatch, PointerEvent } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { boundsOf } from '../lib/grid-range.ts';
import type { RowNotes } from '../lib/row-notes.ts';
import { revealCell } from '../lib/reveal-cell.ts';
import { notesText } from '../lib/row-notes.ts';
import { STATION_COLUMNS } from '../lib/station-columns.ts';
import type { StudioAction } from '../lib/studio-reducer.ts';
import type { CellEditing } from './station-cell.tsx';
import { StationGridHead } from './station-grid-head.tsx';
import { StationRow } from './station-row.tsx';
import { useStationGrid } from './use-station-grid.ts';

export interface StationGridProps {
  readonly content: DraftContent;
  readonly dispatch: Dispatch<StudioAction>;
  readonly notes: ReadonlyMap<number, RowNotes>;
  /** Stations of the reference by radius, as text of the radius. */
  readonly reference: ReadonlyMap<string, DraftStation> | null;
  readonly cursorRow: number | null;
  /** The active row changed by hand: the span cursor follows. */
  readonly onRow: (row: number) => void;
}

function placeOf(event: PointerEvent<HTMLElement>) {
  const cell = event.target instanceof Element ? event.target.closest('[data-row]') : null;
  if (!(cell instanceof HTMLElement)) return null;
  return { row: Number(cell.dataset['row']), column: Number(cell.dataset['column']) };
}

/** The station table: a spreadsheet's keys and clipboard over the draft's stations. */
export function StationGrid({ content, dispatch, notes, reference, cursorRow, onRow }: StationGridProps) {
  const id = useId();
  const table = useRef<HTMLTableElement>(null);
  const frame = useRef<HTMLDivElement>(null);
  const grid = useStationGrid(content, dispatch, () => table.current?.focus({ preventScroll: true }));
  const { range, edit } = grid;
  const bounds = boundsOf(range);
  const activeId =
    content.stations.length === 0 ? undefined : `${id}-${range.focus.row}-${range.focus.column}`;

  const follow = useRef(onRow);
  useEffect(() => {
    follow.current = onRow;
  }, [onRow]);
  useEffect(() => {
    if (activeId === undefined || !table.current?.contains(document.activeElement)) return;
    const cell = document.getElementById(activeId);
    if (cell !== null && frame.current !== null) revealCell(frame.current, cell);
    follow.current(range.focus.row);
  }, [activeId, range.focus.row]);

  const { changeEdit, onEditKeyDown, endEdit } = grid;
  const airfoilNames = useMemo(() => content.airfoils.map((foil) => foil.name), [content.airfoils]);
  const editing: CellEditing | null =
    edit === null
      ? null
      : { edit, airfoilNames, onChange: changeEdit, onKeyDown: onEditKeyDown, onEnd: endEdit };

  const activeNotes = notesText(notes.get(range.focus.row));
  const failing = Object.keys(notes.get(range.focus.row)?.faults ?? {}).length > 0;
  return (
    <section aria-label="Stations" className="flex min-h-0 flex-col">
      <StationTools count={content.stations.length} grid={grid} />
      <div ref={frame} className="min-h-0 flex-1 overflow-auto border border-rule">
        <table
          ref={table}
          role="grid"
          tabIndex={0}
          aria-label="Station table"
          aria-multiselectable="true"
          aria-rowcount={content.stations.length + 1}
          aria-colcount={STATION_COLUMNS.length + 1}
          aria-activedescendant={activeId}
          aria-describedby={`${id}-status`}
          className="w-full border-separate border-spacing-0 select-none"
          onKeyDown={grid.onKeyDown}
          onCopy={grid.onCopy}
          onPaste={grid.onPaste}
          onPointerDown={(event) => {
            const place = placeOf(event);
            if (place === null || event.button !== 0) return;
            // A press inside the open editor places its caret.
            if (edit !== null && place.row === range.focus.row && place.column === range.focus.column) return;
            endEdit();
            grid.select(place, event.shiftKey);
          }}
          onPointerMove={(event) => {
            const place = event.buttons === 1 && edit === null ? placeOf(event) : null;
            if (place !== null) grid.select(place, true);
          }}
          onDoubleClick={() => {
            if (edit === null) grid.startEdit();
          }}
        >
          <StationGridHead />
          <tbody role="rowgroup">
            {content.stations.map((station, row) => {
              const inRange = row >= bounds.top && row <= bounds.bottom;
              const active = row === range.focus.row;
              return (
                <StationRow
                  key={row}
                  gridId={id}
                  station={station}
                  row={row}
                  activeColumn={active ? range.focus.column : -1}
                  selectedFrom={inRange ? bounds.left : -1}
                  selectedTo={inRange ? bounds.right : -1}
                  notes={notes.get(row)}
                  reference={reference?.get(String(station.radiusM))}
                  nearCursor={row === cursorRow}
                  editing={active ? editing : null}
                />
              );
            })}
          </tbody>
        </table>
        {content.stations.length === 0 && (
          <p className="m-0 p-4 text-ink-soft">
            No station yet. Insert one, or paste a block from a spreadsheet here: radius, chord, twist,
            thickness, airfoil.
          </p>
        )}
      </div>
      <p id={`${id}-status`} className="m-0 min-h-10 pt-1 text-xs" aria-live="polite">
        <span className="text-ink-soft">
          Station {content.stations.length === 0 ? 0 : range.focus.row + 1} of {content.stations.length}
          {grid.notice === '' ? '' : ` · ${grid.notice}`}
        </span>
        {activeNotes !== '' && (
          <span className={failing ? 'block text-fails' : 'block text-look'}>{activeNotes}</span>
        )}
      </p>
    </section>
  );
}

function StationTools({ count, grid }: { count: number; grid: ReturnType<typeof useStationGrid> }) {
  return (
    <div className="flex h-8 items-center gap-1">
      <h2 className="sr-only">Stations</h2>
      <span className="mr-auto text-[13px] text-ink-soft">
        {count} {count === 1 ? 'station' : 'stations'}
      </span>
      <Button small kind="quiet" onClick={grid.insert} aria-keyshortcuts="Insert" title="Insert">
        Insert
      </Button>
      <Button
        small
        kind="quiet"
        disabled={count === 0}
        onClick={grid.remove}
        aria-keyshortcuts="Shift+Delete"
        title="Shift + Delete"
      >
        Delete
      </Button>
      <Button
        small
        kind="quiet"
        disabled={count === 0}
        onClick={grid.fill}
        aria-keyshortcuts="Control+D"
        title="Ctrl + D"
      >
        Fill down
      </Button>
    </div>
  );
}
