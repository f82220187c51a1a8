import { designContent, faultsOf } from '@tipward/contract';
import type { DesignContent, DraftContent, DraftStation, Fault } from '@tipward/contract';
import { readNumber } from './read-number.ts';

type Cell = number | string;

function readCell(cell: Cell, field: string, faults: Fault[]): Cell {
  const read = readNumber(cell);
  if (read.fault !== null) faults.push({ field, value: JSON.stringify(cell), message: read.fault });
  return read.value ?? cell;
}

function readStation(station: DraftStation, index: number, faults: Fault[]) {
  const at = (key: string) => `stations[${index}].${key}`;
  return {
    radiusM: readCell(station.radiusM, at('radiusM'), faults),
    chordM: readCell(station.chordM, at('chordM'), faults),
    twistDeg: readCell(station.twistDeg, at('twistDeg'), faults),
    thicknessPct: readCell(station.thicknessPct, at('thicknessPct'), faults),
    airfoil: station.airfoil,
  };
}

/**
 * A draft held against what a version must be.
 * Returns the content when nothing is wrong, else every fault at once (field, value, what is allowed).
 */
export function checkDraft(draft: DraftContent): { content: DesignContent | null; faults: Fault[] } {
  const faults: Fault[] = [];
  const candidate = {
    ...draft,
    pitchDeg: readCell(draft.pitchDeg, 'pitchDeg', faults),
    designTipSpeedRatio: readCell(draft.designTipSpeedRatio, 'designTipSpeedRatio', faults),
    stations: draft.stations.map((station, index) => readStation(station, index, faults)),
  };
  const parsed = designContent.safeParse(candidate);
  if (parsed.success && faults.length === 0) return { content: parsed.data, faults: [] };
  const named = new Set(faults.map((fault) => fault.field));
  const more = parsed.success
    ? []
    : faultsOf(parsed.error, candidate).filter((fault) => !named.has(fault.field));
  return { content: null, faults: [...faults, ...more] };
}

/** The same content as an editable draft. */
export function toDraft(content: DesignContent): DraftContent {
  return {
    ...content,
    airfoils: [...content.airfoils],
    stations: content.stations.map((station) => ({ ...station })),
  };
}
