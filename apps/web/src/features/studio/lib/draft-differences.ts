import type { DraftContent } from '@tipward/contract';
import { STATION_COLUMNS, exactCell } from './station-columns.ts';

export interface DraftDifference {
  readonly where: string;
  readonly mine: string;
  readonly theirs: string;
}

const NOTHING = '–';

function stationDifferences(mine: DraftContent, theirs: DraftContent): DraftDifference[] {
  const rows = Math.max(mine.stations.length, theirs.stations.length);
  return Array.from({ length: rows }, (_, row) => row).flatMap((row) => {
    const [a, b] = [mine.stations[row], theirs.stations[row]];
    return STATION_COLUMNS.flatMap(({ field, label, unit }) => {
      const left = a === undefined ? NOTHING : exactCell(a, field);
      const right = b === undefined ? NOTHING : exactCell(b, field);
      const named = unit === '' ? label : `${label}, ${unit}`;
      return left === right ? [] : [{ where: `Station ${row + 1} · ${named}`, mine: left, theirs: right }];
    });
  });
}

const SETTING_LABELS: Record<string, string> = {
  specificationIssue: 'Specification issue',
  pitchDeg: 'Pitch, °',
  designTipSpeedRatio: 'Design tip-speed ratio',
  tipLoss: 'Tip loss',
  hubLoss: 'Hub loss',
  dragInInduction: 'Drag in induction',
  highInduction: 'High-induction relation',
  elements: 'Elements',
  surfaceState: 'Surface state',
  airfoils: 'Airfoils',
};

function settingsOf(content: DraftContent): Record<string, string> {
  const { specificationIssue, pitchDeg, designTipSpeedRatio, settings, airfoils } = content;
  const shown = Object.entries({ specificationIssue, pitchDeg, designTipSpeedRatio, ...settings });
  return {
    ...Object.fromEntries(shown.map(([key, value]) => [key, String(value)])),
    airfoils: airfoils.map((foil) => `${foil.name} (${foil.polarSetHash.slice(0, 8)})`).join(', '),
  };
}

/** Cell by cell, what differs between two drafts of one design; cells are compared as they stand, text included. */
export function draftDifferences(mine: DraftContent, theirs: DraftContent): DraftDifference[] {
  const [a, b] = [settingsOf(mine), settingsOf(theirs)];
  const settings = Object.keys(SETTING_LABELS)
    .filter((key) => a[key] !== b[key])
    .map((key) => ({
      where: SETTING_LABELS[key] ?? key,
      mine: a[key] ?? NOTHING,
      theirs: b[key] ?? NOTHING,
    }));
  return [...stationDifferences(mine, theirs), ...settings];
}
