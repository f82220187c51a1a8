import type { KeyNumbers } from '@tipward/contract';
import type { QuantityKind } from '@tipward/design-model';

export interface KeyNumberRow {
  readonly key: keyof KeyNumbers;
  readonly label: string;
  readonly unit: string;
  readonly kind: QuantityKind;
  /** Turns the stored value into the shown one. */
  readonly factor?: number;
}

/** Key numbers in the order people ask for them. */
export const KEY_NUMBER_ROWS: readonly KeyNumberRow[] = [
  { key: 'maxCp', label: 'Maximum CP', unit: '', kind: 'cp' },
  { key: 'tipSpeedRatioAtMaxCp', label: 'λ at maximum CP', unit: '', kind: 'lambda' },
  { key: 'ctAtMaxCp', label: 'CT at maximum CP', unit: '', kind: 'ct' },
  { key: 'energyNetMWh', label: 'Annual energy, net', unit: 'MWh', kind: 'energyMWh' },
  { key: 'energyGrossMWh', label: 'Annual energy, gross', unit: 'MWh', kind: 'energyMWh' },
  { key: 'capacityFactor', label: 'Capacity factor', unit: '%', kind: 'percent', factor: 100 },
  { key: 'ratedWindSpeedMS', label: 'Rated wind speed', unit: 'm/s', kind: 'speedMS' },
  { key: 'maxThrustKN', label: 'Largest thrust', unit: 'kN', kind: 'thrustKN' },
  { key: 'maxRootFlapMomentKNm', label: 'Largest root flapwise moment', unit: 'kN·m', kind: 'momentKNm' },
  { key: 'maxRootEdgeMomentKNm', label: 'Largest root edgewise moment', unit: 'kN·m', kind: 'momentKNm' },
  { key: 'maxTipSpeedMS', label: 'Largest tip speed', unit: 'm/s', kind: 'speedMS' },
  { key: 'minStallMarginDeg', label: 'Smallest stall margin', unit: '°', kind: 'angleDeg' },
  { key: 'maxChordM', label: 'Largest chord', unit: 'm', kind: 'chordM' },
  { key: 'solidity', label: 'Solidity', unit: '%', kind: 'percent', factor: 100 },
  { key: 'planformAreaM2', label: 'Planform area of a blade', unit: 'm²', kind: 'areaM2' },
];

export function shownNumber(numbers: KeyNumbers, row: KeyNumberRow): number | null {
  const value = numbers[row.key];
  return value === null ? null : value * (row.factor ?? 1);
}
