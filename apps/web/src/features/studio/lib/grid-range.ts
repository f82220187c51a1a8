import { LAST_COLUMN } from './station-columns.ts';

export interface GridPlace {
  readonly row: number;
  readonly column: number;
}

/** A rectangle of cells: it grows from the anchor to the focus, which is the active cell. */
export interface GridRange {
  readonly anchor: GridPlace;
  readonly focus: GridPlace;
}

export interface GridBounds {
  readonly top: number;
  readonly bottom: number;
  readonly left: number;
  readonly right: number;
}

const within = (value: number, last: number) => Math.min(Math.max(value, 0), Math.max(last, 0));

export const placeRange = (place: GridPlace): GridRange => ({ anchor: place, focus: place });

export function boundsOf({ anchor, focus }: GridRange): GridBounds {
  return {
    top: Math.min(anchor.row, focus.row),
    bottom: Math.max(anchor.row, focus.row),
    left: Math.min(anchor.column, focus.column),
    right: Math.max(anchor.column, focus.column),
  };
}

/** Keeps a range on a table that has shrunk. */
export function clampRange(range: GridRange, rowCount: number): GridRange {
  const clamp = (place: GridPlace): GridPlace => ({
    row: within(place.row, rowCount - 1),
    column: within(place.column, LAST_COLUMN),
  });
  const { anchor, focus } = range;
  return anchor.row < rowCount && focus.row < rowCount
    ? range
    : { anchor: clamp(anchor), focus: clamp(focus) };
}

/** Moves the active cell; `extend` leaves the anchor where it is. Stops at the edges. */
export function moveRange(
  range: GridRange,
  step: { rows?: number; columns?: number },
  rowCount: number,
  extend = false,
): GridRange {
  const focus = {
    row: within(range.focus.row + (step.rows ?? 0), rowCount - 1),
    column: within(range.focus.column + (step.columns ?? 0), LAST_COLUMN),
  };
  return { anchor: extend ? range.anchor : focus, focus };
}

/** The next cell as Tab walks: along the row, then to the next; null past the last (or first) cell. */
export function tabbedRange(range: GridRange, backward: boolean, rowCount: number): GridRange | null {
  const cells = LAST_COLUMN + 1;
  const at = range.focus.row * cells + range.focus.column + (backward ? -1 : 1);
  if (at < 0 || at >= rowCount * cells) return null;
  return placeRange({ row: Math.floor(at / cells), column: at % cells });
}
