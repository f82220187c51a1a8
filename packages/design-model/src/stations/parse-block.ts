import { MAX_STATIONS, STATION_RULES, allowedText } from '@tipward/contract';
import type { DraftStation } from '@tipward/contract';
import { readNumber } from '../content/read-number.ts';

export interface CellFault {
  readonly row: number;
  readonly column: number;
  readonly field: string;
  readonly value: string;
  readonly message: string;
}

export interface StationBlock {
  readonly rows: DraftStation[];
  readonly faults: CellFault[];
  readonly header: string[] | null;
}

type Column = keyof DraftStation;
const ORDER: readonly Column[] = ['radiusM', 'chordM', 'twistDeg', 'thicknessPct', 'airfoil'];
const WORDS: readonly (readonly [RegExp, Column])[] = [
  [/^(r\b|radius|span|r\/)/iu, 'radiusM'],
  [/^(c\b|chord)/iu, 'chordM'],
  [/^(twist|theta|θ|β|beta)/iu, 'twistDeg'],
  [/^(thick|t\/c|rel)/iu, 'thicknessPct'],
  [/^(airfoil|aerofoil|profile|section)/iu, 'airfoil'],
];

function columnOf(title: string): Column | null {
  const plain = title.trim().replace(/^["']|["']$/gu, '');
  return WORDS.find(([word]) => word.test(plain))?.[1] ?? null;
}

/** Tab wins, then semicolon, then comma; a block with semicolons may use decimal commas, which are then refused cell by cell. */
function separatorOf(lines: readonly string[]): string {
  const has = (mark: string) => lines.some((line) => line.includes(mark));
  return has('\t') ? '\t' : has(';') ? ';' : ',';
}

function splitLine(line: string, separator: string): string[] {
  const cells: string[] = [];
  let cell = '';
  let quoted = false;
  for (let i = 0; i < line.length; i += 1) {
    const mark = line[i] ?? '';
    if (mark === '"' && quoted && line[i + 1] === '"') {
      cell += '"';
      i += 1;
    } else if (mark === '"') quoted = !quoted;
    else if (mark === separator && !quoted) {
      cells.push(cell.trim());
      cell = '';
    } else cell += mark;
  }
  return [...cells, cell.trim()];
}

function readRow(
  cells: readonly string[],
  columns: readonly (Column | null)[],
  row: number,
  faults: CellFault[],
): DraftStation {
  const station: DraftStation = { radiusM: '', chordM: '', twistDeg: '', thicknessPct: 21, airfoil: null };
  columns.forEach((field, column) => {
    const text = (cells[column] ?? '').slice(0, 200);
    if (field === null) return;
    if (field === 'airfoil') {
      station.airfoil = text === '' || /^blend/iu.test(text) ? null : text.slice(0, 40);
      return;
    }
    const read = readNumber(text);
    station[field] = read.value ?? text;
    const rule = STATION_RULES[field];
    if (read.fault !== null)
      faults.push({
        row,
        column,
        field,
        value: JSON.stringify(text),
        message: `${rule.label} ${read.fault}`,
      });
    else if (read.value !== null && (read.value > rule.max || read.value < rule.min))
      faults.push({
        row,
        column,
        field,
        value: text,
        message: `${rule.label} is out of range; allowed: ${allowedText(rule)}`,
      });
  });
  return station;
}

/**
 * Stations from a block of a spreadsheet or a CSV text: with or without a header; tabs, semicolons or commas. Without a
 * header the columns are r, chord, twist, relative thickness, airfoil. Faulty cells stay as text in `rows`, each with a
 * fault (row and column count from 0 in `rows`), so that nothing is lost. More than 200 rows: the rest is named in a fault.
 */
export function parseStationBlock(text: string): StationBlock {
  const lines = text
    .replace(/^\uFEFF/u, '')
    .split(/\r\n|\n|\r/u)
    .filter((line) => line.trim() !== '' && !line.startsWith('#'));
  const separator = separatorOf(lines);
  const cells = lines.map((line) => splitLine(line, separator));
  const first = cells[0] ?? [];
  const isHeader = first.some((title) => /\p{L}/u.test(title)) && columnOf(first[0] ?? '') !== null;
  const columns = isHeader ? first.map(columnOf) : ORDER;
  const body = isHeader ? cells.slice(1) : cells;
  const faults: CellFault[] = [];
  const kept = body.slice(0, MAX_STATIONS);
  const rows = kept.map((row, i) => readRow(row, columns, i, faults));
  if (body.length > MAX_STATIONS)
    faults.push({
      row: MAX_STATIONS,
      column: 0,
      field: 'stations',
      value: `${body.length} rows`,
      message: `Too many stations; allowed: at most ${MAX_STATIONS}`,
    });
  return { rows, faults, header: isHeader ? first : null };
}
