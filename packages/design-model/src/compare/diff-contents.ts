import type { DesignContent, Station } from '@tipward/contract';

export interface StationDifference {
  readonly radiusM: number;
  readonly change: 'same' | 'changed' | 'added' | 'removed';
  readonly before: Station | null;
  readonly after: Station | null;
  readonly changedCells: readonly (keyof Station)[];
}
export interface FieldDifference {
  readonly field: string;
  readonly before: string;
  readonly after: string;
}
export interface ContentDiff {
  readonly stations: readonly StationDifference[];
  readonly settings: readonly FieldDifference[];
  readonly inputs: readonly FieldDifference[];
}

const CELLS = ['chordM', 'twistDeg', 'thicknessPct', 'airfoil'] as const;
/** Stations within a tenth of a millimetre are the same station. */
const SAME_RADIUS_M = 1e-4;

function diffStation(before: Station | null, after: Station | null): StationDifference {
  const radiusM = (after ?? before)?.radiusM ?? 0;
  if (before === null || after === null)
    return { radiusM, change: before === null ? 'added' : 'removed', before, after, changedCells: [] };
  const changedCells = CELLS.filter((cell) => before[cell] !== after[cell]);
  return { radiusM, change: changedCells.length === 0 ? 'same' : 'changed', before, after, changedCells };
}

function pairStations(before: readonly Station[], after: readonly Station[]): StationDifference[] {
  const rows: StationDifference[] = [];
  let i = 0;
  let j = 0;
  while (i < before.length || j < after.length) {
    const a = before[i] ?? null;
    const b = after[j] ?? null;
    const gap = a === null ? Infinity : b === null ? -Infinity : a.radiusM - b.radiusM;
    if (Math.abs(gap) <= SAME_RADIUS_M) {
      rows.push(diffStation(a, b));
      i += 1;
      j += 1;
    } else if (gap < 0) {
      rows.push(diffStation(a, null));
      i += 1;
    } else {
      rows.push(diffStation(null, b));
      j += 1;
    }
  }
  return rows;
}

type Fields = Readonly<Record<string, string | number | boolean>>;

function diffFields(before: Fields, after: Fields): FieldDifference[] {
  const fields = [...new Set([...Object.keys(before), ...Object.keys(after)])];
  const shown = (value: string | number | boolean | undefined) => (value === undefined ? '–' : String(value));
  return fields
    .filter((field) => before[field] !== after[field])
    .map((field) => ({ field, before: shown(before[field]), after: shown(after[field]) }));
}

const settingsOf = (content: DesignContent) => ({
  pitchDeg: content.pitchDeg,
  designTipSpeedRatio: content.designTipSpeedRatio,
  ...content.settings,
});
const inputsOf = (content: DesignContent) => ({
  specificationIssue: content.specificationIssue,
  ...Object.fromEntries(
    content.airfoils.map((foil) => [`polars of ${foil.name}`, foil.polarSetHash.slice(0, 12)]),
  ),
});

/** What differs between two contents: stations paired by radius, settings and pinned inputs by name. */
export function diffContents(before: DesignContent, after: DesignContent): ContentDiff {
  return {
    stations: pairStations(before.stations, after.stations),
    settings: diffFields(settingsOf(before), settingsOf(after)),
    inputs: diffFields(inputsOf(before), inputsOf(after)),
  };
}
