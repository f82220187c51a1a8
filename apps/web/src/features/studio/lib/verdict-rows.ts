import type { Evaluation, Verdict } from '@tipward/contract';
import type { QuantityKind } from '@tipward/design-model';
import { formatDifference, formatQuantity } from '@tipward/design-model';

const KINDS: Record<string, QuantityKind> = {
  'max-chord': 'chordM',
  'max-thrust': 'thrustKN',
  'max-root-flap-moment': 'momentKNm',
  'max-root-edge-moment': 'momentKNm',
  'max-tip-speed': 'speedMS',
  'min-cp': 'cp',
  'min-energy': 'energyMWh',
  'min-stall-margin': 'angleDeg',
  'max-chord-curvature': 'percent',
  'max-twist-curvature': 'angleDeg',
};

/** Where a governing point can be looked at. */
export type VerdictPlace =
  | { readonly kind: 'radius'; readonly radiusM: number; readonly text: string }
  | { readonly kind: 'tip-speed-ratio'; readonly tipSpeedRatio: number; readonly text: string };

export interface VerdictRow {
  readonly verdict: Verdict;
  readonly value: string;
  readonly limit: string;
  readonly margin: string;
  readonly place: VerdictPlace | null;
}

function placeOf({ at }: Verdict, schedule: Evaluation['schedule']): VerdictPlace | null {
  if (at === null) return null;
  if (at.quantity === 'radius')
    return { kind: 'radius', radiusM: at.value, text: `r ${formatQuantity('radiusM', at.value)} m` };
  if (at.quantity === 'tip-speed-ratio')
    return {
      kind: 'tip-speed-ratio',
      tipSpeedRatio: at.value,
      text: `λ ${formatQuantity('lambda', at.value)}`,
    };
  const point = schedule.find((each) => each.windSpeedMS === at.value);
  if (point === undefined) return null;
  return {
    kind: 'tip-speed-ratio',
    tipSpeedRatio: point.tipSpeedRatio,
    text: `${formatQuantity('speedMS', at.value)} m/s`,
  };
}

const ORDER: Record<Verdict['verdict'], number> = { fails: 0, unknown: 1, holds: 2 };

/** Verdicts as rows, what fails first. */
export function verdictRows(evaluation: Evaluation): VerdictRow[] {
  return evaluation.verdicts
    .map((verdict) => {
      const kind = KINDS[verdict.kind] ?? 'factor';
      return {
        verdict,
        value: formatQuantity(kind, verdict.value),
        limit: `${verdict.bound === 'upper' ? '≤' : '≥'}\u2009${formatQuantity(kind, verdict.limit)}`,
        margin: formatDifference(kind, verdict.margin),
        place: placeOf(verdict, evaluation.schedule),
      };
    })
    .sort((a, b) => ORDER[a.verdict.verdict] - ORDER[b.verdict.verdict]);
}
