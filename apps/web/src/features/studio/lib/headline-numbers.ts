import type { Evaluation, KeyNumbers } from '@tipward/contract';
import type { LiveResult, QuantityKind } from '@tipward/design-model';
import { formatDifference, formatQuantity } from '@tipward/design-model';

export interface HeadlineNumber {
  readonly id: string;
  readonly label: string;
  readonly unit: string;
  readonly value: string;
  /** Against the reference, with its sign; '–' where either is unknown. */
  readonly difference: string;
  /** In % of the reference, where a share says more. */
  readonly share: string;
  /** Answers the content in hand. */
  readonly current: boolean;
}

interface Wanted {
  readonly key: keyof KeyNumbers;
  readonly label: string;
  readonly unit: string;
  readonly quantity: QuantityKind;
  readonly shared: boolean;
  readonly live?: (result: LiveResult) => number | null;
}

const WANTED: readonly Wanted[] = [
  { key: 'maxCp', label: 'Max CP', unit: '', quantity: 'cp', shared: true, live: (r) => r.maxCp },
  {
    key: 'tipSpeedRatioAtMaxCp',
    label: 'λ at max CP',
    unit: '',
    quantity: 'lambda',
    shared: false,
    live: (r) => r.tipSpeedRatioAtMaxCp,
  },
  {
    key: 'ctAtMaxCp',
    label: 'CT at max CP',
    unit: '',
    quantity: 'ct',
    shared: true,
    live: (r) => r.ctAtMaxCp,
  },
  { key: 'energyNetMWh', label: 'Annual energy (net)', unit: 'MWh', quantity: 'energyMWh', shared: true },
  {
    key: 'maxRootFlapMomentKNm',
    label: 'Max root flapwise moment',
    unit: 'kN·m',
    quantity: 'momentKNm',
    shared: true,
  },
  { key: 'maxThrustKN', label: 'Max thrust', unit: 'kN', quantity: 'thrustKN', shared: true },
];

interface Sources {
  readonly live: { readonly output: LiveResult | null; readonly current: boolean };
  readonly evaluation: { readonly output: Evaluation | null; readonly current: boolean };
  readonly reference: KeyNumbers | null;
}

/** The few numbers an edit is judged by, with their differences against the reference. */
export function headlineNumbers({ live, evaluation, reference }: Sources): HeadlineNumber[] {
  return WANTED.map(({ key, label, unit, quantity, shared, live: fromLive }) => {
    const value =
      fromLive === undefined
        ? (evaluation.output?.keyNumbers[key] ?? null)
        : live.output === null
          ? null
          : fromLive(live.output);
    const before = reference?.[key] ?? null;
    const difference = value === null || before === null ? null : value - before;
    const share =
      difference === null || before === null || before === 0 || !shared ? null : (100 * difference) / before;
    return {
      id: key,
      label,
      unit,
      value: formatQuantity(quantity, value),
      difference: formatDifference(quantity, difference),
      share: share === null ? '' : `${formatDifference('percent', share)} %`,
      current: fromLive === undefined ? evaluation.current : live.current,
    };
  });
}
