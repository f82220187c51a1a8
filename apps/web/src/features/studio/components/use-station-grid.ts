import type { DraftContent } from '@tipward/contract';
import { useCallback, useRef, useState } from 'react';
import type { ClipboardEvent, Dispatch, KeyboardEvent } from 'react';
import {
  cellEditLabel,
  cellText,
  clearCells,
  deleteStations,
  fillDown,
  insertStation,
  insertedRow,
  pasteBlock,
  rowsLeftOut,
  setCellText,
} from '../lib/edit-content.ts';
import type { GridPlace, GridRange } from '../lib/grid-range.ts';
import { boundsOf, clampRange, moveRange, placeRange, tabbedRange } from '../lib/grid-range.ts';
import { copyBlock, readBlock } from '../lib/station-block.ts';
import { LAST_COLUMN, fieldAt } from '../lib/station-columns.ts';
import type { StudioAction } from '../lib/studio-reducer.ts';
import type { GridCommand } from './grid-keys.ts';
import { commandOf } from './grid-keys.ts';

/** A cell being edited. Its keys are one step of the undo list, named by `mergeKey`. */
export interface CellEdit {
  readonly text: string;
  readonly mergeKey: string;
  /** Typing replaced the cell: arrows keep it and move on. F2 opened it: arrows move the caret. */
  readonly typed: boolean;
}

export interface StationGridModel {
  readonly range: GridRange;
  readonly edit: CellEdit | null;
  /** Said to screen readers after a paste or a deletion. */
  readonly notice: string;
  readonly select: (place: GridPlace, extend?: boolean) => void;
  readonly startEdit: (text?: string) => void;
  readonly changeEdit: (text: string) => void;
  readonly endEdit: () => void;
  readonly onKeyDown: (event: KeyboardEvent<HTMLElement>) => void;
  readonly onEditKeyDown: (event: KeyboardEvent<HTMLElement>) => void;
  readonly onCopy: (event: ClipboardEvent<HTMLElement>) => void;
  readonly onPaste: (event: ClipboardEvent<HTMLElement>) => void;
  readonly insert: () => void;
  readonly remove: () => void;
  readonly fill: () => void;
}

const plural = (count: number, noun: string) => `${count} ${noun}${count === 1 ? '' : 's'}`;

/** Selection, editing, keys and clipboard of the station table. */
export function useStationGrid(
  content: DraftContent,
  dispatch: Dispatch<StudioAction>,
  focusGrid: () => void,
): StationGridModel {
  const [heldRange, setRange] = useState<GridRange>(placeRange({ row: 0, column: 0 }));
  const [edit, setEdit] = useState<CellEdit | null>(null);
  const [notice, setNotice] = useState('');
  const edits = useRef(0);
  /** Escape lets the next Tab out of the table. */
  const leaving = useRef(false);
  const rowCount = content.stations.length;
  const range = clampRange(heldRange, rowCount);
  const { row, column } = range.focus;
  const bounds = boundsOf(range);

  const select = useCallback((place: GridPlace, extend = false) => {
    setNotice('');
    setRange((before) => ({ anchor: extend ? before.anchor : place, focus: place }));
  }, []);
  const change = (label: string, edited: (content: DraftContent) => DraftContent) => {
    dispatch({ type: 'change', label, change: edited });
  };
  const write = (text: string, mergeKey: string) => {
    dispatch({
      type: 'change',
      label: cellEditLabel(row, column),
      mergeKey,
      change: setCellText(row, fieldAt(column), text),
    });
  };
  const startEdit = (text?: string) => {
    if (rowCount === 0) return;
    edits.current += 1;
    const mergeKey = `cell-${edits.current}`;
    setEdit({ text: text ?? cellText(content, row, column), mergeKey, typed: text !== undefined });
    if (text !== undefined && fieldAt(column) !== 'airfoil') write(text, mergeKey);
  };
  const changeEdit = (text: string) => {
    if (edit === null) return;
    setEdit({ ...edit, text });
    write(text, edit.mergeKey);
  };
  const endEdit = () => {
    setEdit(null);
  };
  const insert = () => {
    change('Insert station', insertStation(row));
    setRange(placeRange({ row: insertedRow(rowCount, row), column }));
    setNotice('Station inserted');
  };
  const remove = () => {
    if (rowCount === 0) return;
    const count = bounds.bottom - bounds.top + 1;
    change(`Delete ${plural(count, 'station')}`, deleteStations(bounds));
    setRange(placeRange({ row: bounds.top, column }));
    setNotice(`${plural(count, 'station')} deleted`);
  };
  const fill = () => {
    change('Fill down', fillDown(bounds));
  };
  const tab = (event: KeyboardEvent, backward: boolean) => {
    const next = leaving.current ? null : tabbedRange(range, backward, rowCount);
    leaving.current = false;
    if (next === null) return;
    event.preventDefault();
    setRange(next);
  };
  const actions: Record<Exclude<GridCommand['kind'], 'move' | 'tab' | 'type'>, () => void> = {
    edit: () => {
      startEdit();
    },
    clear: () => {
      change('Empty cells', clearCells(bounds));
    },
    insert,
    'delete-rows': remove,
    fill,
    all: () => {
      setRange({ anchor: { row: 0, column: 0 }, focus: { row: rowCount - 1, column: LAST_COLUMN } });
    },
    leave: () => {
      leaving.current = true;
    },
  };
  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    if (edit !== null) return;
    const command = commandOf(event);
    if (command === null) return;
    if (command.kind === 'tab') {
      tab(event, command.backward);
      return;
    }
    leaving.current = false;
    event.preventDefault();
    setNotice('');
    if (command.kind === 'move') setRange(moveRange(range, command, rowCount, command.extend));
    else if (command.kind === 'type') startEdit(command.text);
    else actions[command.kind]();
  };
  const keepAndMove = (event: KeyboardEvent, next: GridRange | null) => {
    event.preventDefault();
    endEdit();
    if (next !== null) setRange(next);
    focusGrid();
  };
  const onEditKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    // Undo in an open cell is the text's own; saving is the studio's everywhere.
    if (!(event.ctrlKey || event.metaKey) || event.key.toLowerCase() !== 's') event.stopPropagation();
    if (edit === null || event.nativeEvent.isComposing) return;
    const vertical = { ArrowUp: -1, ArrowDown: 1 }[event.key];
    if (event.key === 'Escape') {
      dispatch({ type: 'cancel', mergeKey: edit.mergeKey });
      keepAndMove(event, null);
    } else if (event.key === 'Enter')
      keepAndMove(event, moveRange(range, { rows: event.shiftKey ? -1 : 1 }, rowCount));
    else if (event.key === 'Tab') keepAndMove(event, tabbedRange(range, event.shiftKey, rowCount));
    else if (edit.typed && vertical !== undefined && fieldAt(column) !== 'airfoil')
      keepAndMove(event, moveRange(range, { rows: vertical }, rowCount));
  };
  const onCopy = (event: ClipboardEvent<HTMLElement>) => {
    if (edit !== null) return;
    event.preventDefault();
    event.clipboardData.setData('text/plain', copyBlock(content.stations, bounds));
    setNotice(`${plural(bounds.bottom - bounds.top + 1, 'row')} copied`);
  };
  const onPaste = (event: ClipboardEvent<HTMLElement>) => {
    if (edit !== null) return;
    event.preventDefault();
    const block = readBlock(event.clipboardData.getData('text/plain'), bounds.left);
    if (block.rows.length === 0 || block.fields.length === 0) return;
    change(`Paste ${plural(block.rows.length, 'row')}`, pasteBlock(block, bounds));
    const left = rowsLeftOut(block, bounds.top);
    setNotice(
      `${plural(block.rows.length - left, 'row')} pasted` +
        (left > 0 ? `; ${left} left out, a design holds at most 200 stations` : ''),
    );
  };
  return {
    range,
    edit,
    notice,
    select,
    startEdit,
    changeEdit,
    endEdit,
    onKeyDown,
    onEditKeyDown,
    onCopy,
    onPaste,
    insert,
    remove,
    fill,
  };
}
