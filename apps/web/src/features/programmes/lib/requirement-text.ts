import { REQUIREMENT_KINDS } from '@tipward/contract';
import type { Requirement, RequirementKind, Verdict } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import type { QuantityKind } from '@tipward/design-model';

const QUANTITIES: Record<RequirementKind, QuantityKind> = {
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

/** A value of the kind of this requirement, with its fixed decimals. */
export const requirementValue = (kind: RequirementKind, value: number | null): string =>
  formatQuantity(QUANTITIES[kind], value);

/** '≤ 0.800' or '≥ 0.4500'. */
export function limitText({ kind, limit }: Pick<Requirement, 'kind' | 'limit'>): string {
  return `${REQUIREMENT_KINDS[kind].bound === 'upper' ? '≤' : '≥'} ${requirementValue(kind, limit)}`;
}

/** What one result says of one requirement; null where it was not held against it. */
export function verdictOn(
  kind: RequirementKind,
  limit: number,
  verdicts: readonly Verdict[],
): { verdict: Verdict; otherLimit: boolean } | null {
  const verdict = verdicts.find((one) => one.kind === kind);
  return verdict === undefined ? null : { verdict, otherLimit: verdict.limit !== limit };
}
