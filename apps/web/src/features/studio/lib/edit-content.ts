import { MAX_STATIONS } from '@tipward/contract';
import type { DraftContent, DraftStation } from '@tipward/contract';
import type { GridBounds } from './grid-range.ts';
import type { PastedBlock } from './station-block.ts';
import { STATION_COLUMNS, exactCell, fieldAt, withCellText } from './station-columns.ts';
import type { NumberField, StationField } from './station-columns.ts';

/** Changes to a draft. Each gives a new content that shares what it did not touch, or the same one when nothing changed. */
type Edit = (content: DraftContent) => DraftContent;

const EMPTY: DraftStation = { radiusM: '', chordM: '', twistDeg: '', thicknessPct: '', airfoil: null };
/** Decimals an inserted station is rounded to: what a drawing holds. */
const INSERT_DECIMALS: Record<NumberField, number> = { radiusM: 3, chordM: 3, twistDeg: 2, thicknessPct: 1 };

function mapRows(
  content: DraftContent,
  bounds: Pick<GridBounds, 'top' | 'bottom'>,
  change: (station: DraftStation, row: number) => DraftStation,
): DraftContent {
  const stations = content.stations.map((station, row) =>
    row < bounds.top || row > bounds.bottom ? station : change(station, row),
  );
  return { ...content, stations };
}

export const setCellText =
  (row: number, field: StationField, text: string): Edit =>
  (content) =>
    mapRows(content, { top: row, bottom: row }, (station) => withCellText(station, field, text));

/** Empties cells: numbers become empty text (which a version refuses), airfoils become blended. */
export const clearCells =
  (bounds: GridBounds): Edit =>
  (content) =>
    mapRows(content, bounds, (station) =>
      columnsOf(bounds).reduce((changed, field) => withCellText(changed, field, ''), station),
    );

function columnsOf(bounds: GridBounds): StationField[] {
  return STATION_COLUMNS.slice(bounds.left, bounds.right + 1).map(({ field }) => field);
}

/** Writes the top row of a range into the rows beneath; a single row takes the one above it. */
export const fillDown =
  (bounds: GridBounds): Edit =>
  (content) => {
    const from = bounds.top === bounds.bottom ? bounds.top - 1 : bounds.top;
    const source = content.stations[from];
    if (source === undefined) return content;
    return mapRows(content, { top: from + 1, bottom: bounds.bottom }, (station) =>
      columnsOf(bounds).reduce((filled, field) => ({ ...filled, [field]: source[field] }), station),
    );
  };

function between(above: DraftStation, below: DraftStation): DraftStation {
  const middle = (field: NumberField) => {
    const [a, b] = [above[field], below[field]];
    if (typeof a !== 'number' || typeof b !== 'number') return '';
    return Number((a + 0.5 * (b - a)).toFixed(INSERT_DECIMALS[field]));
  };
  return {
    radiusM: middle('radiusM'),
    chordM: middle('chordM'),
    twistDeg: middle('twistDeg'),
    thicknessPct: middle('thicknessPct'),
    airfoil: above.airfoil === below.airfoil ? above.airfoil : null,
  };
}

/** Row a new station would take when asked for below `row`; before the last one, since the tip stays the tip. */
export function insertedRow(stationCount: number, row: number): number {
  return stationCount === 0 ? 0 : Math.max(Math.min(row + 1, stationCount - 1), Math.min(1, stationCount));
}

/** Inserts a station half way between its neighbours; an empty one where there are none. */
export const insertStation =
  (row: number): Edit =>
  (content) => {
    const { stations } = content;
    if (stations.length >= MAX_STATIONS) return content;
    const at = insertedRow(stations.length, row);
    const above = stations[at - 1];
    const below = stations[at];
    const made = above === undefined || below === undefined ? EMPTY : between(above, below);
    return { ...content, stations: stations.toSpliced(at, 0, made) };
  };

export const deleteStations =
  (bounds: GridBounds): Edit =>
  (content) => ({
    ...content,
    stations: content.stations.toSpliced(bounds.top, bounds.bottom - bounds.top + 1),
  });

/** How many pasted rows find no place, since a design holds at most 200 stations. */
export function rowsLeftOut(block: PastedBlock, row: number): number {
  return Math.max(0, row + block.rows.length - MAX_STATIONS);
}

/** Pastes from a row downwards, adding stations where the table ends. One value fills the whole range. */
export const pasteBlock =
  (block: PastedBlock, bounds: GridBounds): Edit =>
  (content) => {
    const single = block.rows.length === 1 && block.rows[0]?.length === 1 ? block.rows[0][0] : undefined;
    if (single !== undefined && (bounds.bottom > bounds.top || bounds.right > bounds.left))
      return mapRows(content, bounds, (station) =>
        columnsOf(bounds).reduce((filled, field) => withCellText(filled, field, single), station),
      );
    const rows = block.rows.slice(0, MAX_STATIONS - bounds.top);
    const stations = [...content.stations];
    rows.forEach((cells, i) => {
      stations[bounds.top + i] = block.fields.reduce(
        (station, field, column) => withCellText(station, field, cells[column] ?? ''),
        stations[bounds.top + i] ?? EMPTY,
      );
    });
    return rows.length === 0 ? content : { ...content, stations };
  };

/** 'Chord at station 4 → 0.52': the name of an edit in the undo list. */
export function cellEditLabel(row: number, column: number): string {
  const label = STATION_COLUMNS.find(({ field }) => field === fieldAt(column))?.label ?? 'Cell';
  return `${label} at station ${row + 1}`;
}

export function cellText(content: DraftContent, row: number, column: number): string {
  const station = content.stations[row];
  return station === undefined ? '' : exactCell(station, fieldAt(column));
}
