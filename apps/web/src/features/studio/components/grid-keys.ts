import type { KeyboardEvent } from 'react';

/** What a key means to the station table while no cell is being edited. */
export type GridCommand =
  | { readonly kind: 'move'; readonly rows: number; readonly columns: number; readonly extend: boolean }
  | { readonly kind: 'tab'; readonly backward: boolean }
  | { readonly kind: 'edit' }
  | { readonly kind: 'type'; readonly text: string }
  | { readonly kind: 'clear' | 'insert' | 'delete-rows' | 'fill' | 'all' | 'leave' };

const FAR = 1000;
const PAGE_ROWS = 10;
const ARROWS: Record<string, readonly [number, number]> = {
  ArrowUp: [-1, 0],
  ArrowDown: [1, 0],
  ArrowLeft: [0, -1],
  ArrowRight: [0, 1],
  PageUp: [-PAGE_ROWS, 0],
  PageDown: [PAGE_ROWS, 0],
  Home: [0, -FAR],
  End: [0, FAR],
};

function moveOf(event: KeyboardEvent, ctrl: boolean): GridCommand | null {
  const arrow = ARROWS[event.key];
  if (arrow === undefined) return null;
  const [rows, columns] = arrow;
  if (!ctrl) return { kind: 'move', rows, columns, extend: event.shiftKey };
  const toEnd = event.key === 'Home' ? -FAR : event.key === 'End' ? FAR : rows * FAR;
  return { kind: 'move', rows: toEnd, columns: columns * FAR, extend: event.shiftKey };
}

const CTRL_COMMANDS: Record<string, GridCommand> = { d: { kind: 'fill' }, a: { kind: 'all' } };
const PLAIN_COMMANDS: Record<string, GridCommand> = {
  Enter: { kind: 'edit' },
  F2: { kind: 'edit' },
  Backspace: { kind: 'clear' },
  Insert: { kind: 'insert' },
  Escape: { kind: 'leave' },
};

/** Null: the key is not the table's (copy, paste, undo and the browser's own pass through). */
export function commandOf(event: KeyboardEvent): GridCommand | null {
  const ctrl = event.ctrlKey || event.metaKey;
  const move = moveOf(event, ctrl);
  if (move !== null) return move;
  if (ctrl) return CTRL_COMMANDS[event.key.toLowerCase()] ?? null;
  if (event.altKey) return null;
  if (event.key === 'Tab') return { kind: 'tab', backward: event.shiftKey };
  if (event.key === 'Delete') return { kind: event.shiftKey ? 'delete-rows' : 'clear' };
  const plain = PLAIN_COMMANDS[event.key];
  if (plain !== undefined) return plain;
  return event.key.length === 1 ? { kind: 'type', text: event.key } : null;
}
