import type { DesignContent, Evaluation, KeyNumbers, Station } from '@tipward/contract';
import type { StationDifference } from './diff-contents.ts';
import { diffContents } from './diff-contents.ts';
import { formatDifference, formatQuantity } from '../format/format-quantity.ts';
import type { QuantityKind } from '../format/format-quantity.ts';

export interface Compared {
  readonly content: DesignContent;
  readonly evaluation: Evaluation;
}

const percent = (change: number) => `${Math.abs(change).toFixed(1)} %`;

function spanText(rows: readonly StationDifference[], tipRadiusM: number): string {
  const first = rows[0];
  const last = rows.at(-1);
  if (first === undefined || last === undefined) return '';
  const share = (row: StationDifference) => (row.radiusM / tipRadiusM).toFixed(2);
  return first === last ? `at r/R ${share(first)}` : `between r/R ${share(first)} and ${share(last)}`;
}

function direction(changes: readonly number[]): 'raised' | 'reduced' | 'changed' {
  if (changes.every((change) => change > 0)) return 'raised';
  if (changes.every((change) => change < 0)) return 'reduced';
  return 'changed';
}

function cellSentence(
  rows: readonly StationDifference[],
  cell: 'chordM' | 'twistDeg' | 'thicknessPct',
  tipRadiusM: number,
): string[] {
  const changed = rows.filter((row) => row.changedCells.includes(cell));
  if (changed.length === 0) return [];
  const pairs = changed.flatMap((row) =>
    row.before === null || row.after === null ? [] : [[row.before[cell], row.after[cell]] as const],
  );
  const changes = pairs.map(([before, after]) => after - before);
  const how = direction(changes);
  const where = spanText(changed, tipRadiusM);
  if (cell === 'chordM') {
    const largest = Math.max(
      ...pairs.map(([before, after]) => (before === 0 ? 100 : Math.abs((100 * (after - before)) / before))),
    );
    return [`Chord ${how} by up to ${percent(largest)} ${where}.`];
  }
  const largest = Math.max(...changes.map(Math.abs));
  return cell === 'twistDeg'
    ? [`Twist ${how} by up to ${largest.toFixed(2)}° ${where}.`]
    : [`Relative thickness ${how} by up to ${largest.toFixed(1)} % of chord ${where}.`];
}

function airfoilSentence(rows: readonly StationDifference[], tipRadiusM: number): string[] {
  const changed = rows.filter((row) => row.changedCells.includes('airfoil'));
  if (changed.length === 0) return [];
  const name = (station: Station | null) => station?.airfoil ?? 'blended';
  const steps = [...new Set(changed.map((row) => `${name(row.before)} to ${name(row.after)}`))];
  return [`Airfoil changed ${spanText(changed, tipRadiusM)} (${steps.join('; ')}).`];
}

function countSentence(rows: readonly StationDifference[]): string[] {
  const count = (change: StationDifference['change']) => rows.filter((row) => row.change === change).length;
  const words = [
    count('added') > 0 ? `${count('added')} added` : '',
    count('removed') > 0 ? `${count('removed')} removed` : '',
  ].filter((word) => word !== '');
  return words.length === 0 ? [] : [`Stations: ${words.join(', ')}.`];
}

const MEASURES: readonly { key: keyof KeyNumbers; label: string; kind: QuantityKind; relative: boolean }[] = [
  { key: 'maxCp', label: 'Maximum CP', kind: 'cp', relative: false },
  { key: 'energyNetMWh', label: 'Annual energy (net)', kind: 'energyMWh', relative: true },
  { key: 'maxRootFlapMomentKNm', label: 'Largest root flapwise moment', kind: 'momentKNm', relative: true },
  { key: 'maxThrustKN', label: 'Largest thrust', kind: 'thrustKN', relative: true },
];

function numberSentences(before: KeyNumbers, after: KeyNumbers): string[] {
  return MEASURES.flatMap(({ key, label, kind, relative }) => {
    const a = before[key];
    const b = after[key];
    if (a === null || b === null) return [];
    const change = relative
      ? `${formatDifference('percent', a === 0 ? null : (100 * (b - a)) / a)} %`
      : formatDifference(kind, b - a);
    return [`${label} ${formatQuantity(kind, a)} → ${formatQuantity(kind, b)} (${change}).`];
  });
}

/** What changed from one content to the next and what it did, one sentence each, in plain engineering English. */
export function summariseChange({ before, after }: { before: Compared; after: Compared }): string[] {
  const diff = diffContents(before.content, after.content);
  const tipRadiusM = after.content.stations.at(-1)?.radiusM ?? 1;
  const blade = [
    ...cellSentence(diff.stations, 'chordM', tipRadiusM),
    ...cellSentence(diff.stations, 'twistDeg', tipRadiusM),
    ...cellSentence(diff.stations, 'thicknessPct', tipRadiusM),
    ...airfoilSentence(diff.stations, tipRadiusM),
    ...countSentence(diff.stations),
    ...[...diff.settings, ...diff.inputs].map(
      ({ field, before: was, after: is }) => `${field}: ${was} → ${is}.`,
    ),
  ];
  const same = blade.length === 0 ? ['Geometry and settings are the same.'] : blade;
  return [...same, ...numberSentences(before.evaluation.keyNumbers, after.evaluation.keyNumbers)];
}
