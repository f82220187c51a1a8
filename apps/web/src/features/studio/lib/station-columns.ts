import type { DraftStation } from '@tipward/contract';
import { formatQuantity, readNumber } from '@tipward/design-model';
import type { QuantityKind } from '@tipward/design-model';

export type StationField = keyof DraftStation;
export type NumberField = Exclude<StationField, 'airfoil'>;

export interface StationColumn {
  readonly field: StationField;
  readonly label: string;
  readonly symbol: string;
  readonly unit: string;
  readonly quantity: QuantityKind | null;
}

/** The station table, left to right. Units stand in the header only. */
export const STATION_COLUMNS: readonly StationColumn[] = [
  { field: 'radiusM', label: 'Radius', symbol: 'r', unit: 'm', quantity: 'radiusM' },
  { field: 'chordM', label: 'Chord', symbol: 'c', unit: 'm', quantity: 'chordM' },
  { field: 'twistDeg', label: 'Twist', symbol: 'θ', unit: '°', quantity: 'twistDeg' },
  { field: 'thicknessPct', label: 'Thickness', symbol: 't/c', unit: '%', quantity: 'thicknessPct' },
  { field: 'airfoil', label: 'Airfoil', symbol: '', unit: '', quantity: null },
];
export const LAST_COLUMN = STATION_COLUMNS.length - 1;
export const BLENDED = 'blended';

const MAX_CELL_TEXT = 200;
const MAX_AIRFOIL_TEXT = 40;

export function fieldAt(column: number): StationField {
  return (STATION_COLUMNS[column] ?? { field: 'radiusM' as const }).field;
}

/** What a cell shows: fixed decimals for numbers, text as it was typed, 'blended' without a named airfoil. */
export function shownCell(station: DraftStation, column: StationColumn): string {
  const value = station[column.field];
  if (value === null) return BLENDED;
  return typeof value === 'number' && column.quantity !== null
    ? formatQuantity(column.quantity, value)
    : String(value);
}

/** What a cell holds, at full precision: for the editor and the clipboard. */
export function exactCell(station: DraftStation, field: StationField): string {
  const value = station[field];
  return value === null ? BLENDED : String(value);
}

/** A station with a cell set from text. Text that is no number stays text, so that nothing typed is lost. */
export function withCellText(station: DraftStation, field: StationField, text: string): DraftStation {
  const plain = text.trim();
  if (field === 'airfoil') {
    const blended = plain === '' || plain.toLowerCase() === BLENDED;
    return { ...station, airfoil: blended ? null : plain.slice(0, MAX_AIRFOIL_TEXT) };
  }
  return { ...station, [field]: readNumber(plain).value ?? plain.slice(0, MAX_CELL_TEXT) };
}
