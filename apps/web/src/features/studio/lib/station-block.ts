import type { DraftStation } from '@tipward/contract';
import type { GridBounds } from './grid-range.ts';
import { LAST_COLUMN, STATION_COLUMNS, exactCell, fieldAt } from './station-columns.ts';
import type { StationField } from './station-columns.ts';

/** Text of a block with the columns it is meant for. */
export interface PastedBlock {
  readonly fields: readonly StationField[];
  readonly rows: readonly (readonly string[])[];
}

/** A range as a spreadsheet takes it: tabs, with a header that names units; numbers at full precision. */
export function copyBlock(stations: readonly DraftStation[], bounds: GridBounds): string {
  const columns = STATION_COLUMNS.slice(bounds.left, bounds.right + 1);
  const header = columns.map(({ label, unit }) => (unit === '' ? label : `${label} [${unit}]`));
  const rows = stations
    .slice(bounds.top, bounds.bottom + 1)
    .map((station) => columns.map(({ field }) => exactCell(station, field)));
  return [header, ...rows].map((cells) => cells.join('\t')).join('\r\n');
}

function separatorOf(lines: readonly string[]): string | null {
  if (lines.some((line) => line.includes('\t'))) return '\t';
  if (lines.some((line) => line.includes(';'))) return ';';
  // One comma may be a decimal comma; three columns of them are a list.
  return lines.every((line) => line.split(',').length >= 3) ? ',' : null;
}

const HEADER_FIELDS: readonly (readonly [RegExp, StationField])[] = [
  [/^(r\b|radius|span)/iu, 'radiusM'],
  [/^(c\b|chord)/iu, 'chordM'],
  [/^(twist|theta|θ|beta|β)/iu, 'twistDeg'],
  [/^(thick|t\/c|rel)/iu, 'thicknessPct'],
  [/^(airfoil|aerofoil|profile|section)/iu, 'airfoil'],
];

/** Columns a header names, in its order, unknown ones null; null when the first line names none. */
function headerFields(cells: readonly string[]): (StationField | null)[] | null {
  const fields = cells.map((cell) => HEADER_FIELDS.find(([word]) => word.test(cell))?.[1] ?? null);
  return fields.some((field) => field !== null) ? fields : null;
}

function splitCells(line: string, separator: string | null): string[] {
  const cells = separator === null ? [line] : line.split(separator);
  return cells.map((cell) => cell.trim().replace(/^"(.*)"$/u, '$1'));
}

/**
 * A block of the clipboard. With a header its columns go where the header says, else they run rightwards from `column`;
 * columns the table does not have are left out.
 */
export function readBlock(text: string, column: number): PastedBlock {
  const lines = text
    .replace(/^\uFEFF/u, '')
    .split(/\r\n|\n|\r/u)
    .filter((line) => line.trim() !== '');
  const separator = separatorOf(lines);
  const cells = lines.map((line) => splitCells(line, separator));
  const fields = cells.length > 1 ? headerFields(cells[0] ?? []) : null;
  const width = Math.max(0, ...cells.map((row) => row.length));
  const target =
    fields ??
    Array.from({ length: width }, (_, i) => (column + i <= LAST_COLUMN ? fieldAt(column + i) : null));
  const kept = target.flatMap((field, i) => (field === null ? [] : [{ field, i }]));
  return {
    fields: kept.map(({ field }) => field),
    rows: (fields === null ? cells : cells.slice(1)).map((row) => kept.map(({ i }) => row[i] ?? '')),
  };
}
