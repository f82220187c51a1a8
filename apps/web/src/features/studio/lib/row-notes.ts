import { STATION_RULES } from '@tipward/contract';
import type { Fault, Warning } from '@tipward/contract';
import type { StationField } from './station-columns.ts';

/** What is to be said beside a row. */
export interface RowNotes {
  readonly faults: Partial<Record<StationField, string>>;
  readonly warnings: readonly string[];
}

const STATION_FIELD = /^stations\[(\d+)\]\.(radiusM|chordM|twistDeg|thicknessPct|airfoil)$/u;

function faultText(field: StationField, message: string): string {
  const label = field === 'airfoil' ? 'Airfoil' : STATION_RULES[field].label;
  return message.startsWith(label) ? message : `${label} ${message}`;
}

/** Faults and warnings by row; what concerns no single station is left to `rotorFaults` and the list of warnings. */
export function notesByRow(faults: readonly Fault[], warnings: readonly Warning[]): Map<number, RowNotes> {
  const notes = new Map<number, { faults: Partial<Record<StationField, string>>; warnings: string[] }>();
  const at = (row: number) => {
    const held = notes.get(row) ?? { faults: {}, warnings: [] };
    notes.set(row, held);
    return held;
  };
  for (const { field, message } of faults) {
    const match = STATION_FIELD.exec(field);
    if (match === null) continue;
    const cell = match[2] as StationField;
    at(Number(match[1])).faults[cell] ??= faultText(cell, message);
  }
  for (const { station, message } of warnings) if (station !== null) at(station).warnings.push(message);
  return notes;
}

/** Faults of the design as a whole: pitch, settings, too few stations. */
export const rotorFaults = (faults: readonly Fault[]): Fault[] =>
  faults.filter(({ field }) => !STATION_FIELD.test(field));

/** All of a row's notes in one line, faults first; empty when there are none. */
export function notesText(notes: RowNotes | undefined): string {
  if (notes === undefined) return '';
  return [...Object.values(notes.faults), ...notes.warnings].join(' · ');
}
