import type { Programme } from '@tipward/contract';

export const START_KINDS = [
  { kind: 'sized', label: 'Sized from the specification' },
  { kind: 'stations', label: 'From stations of a spreadsheet' },
  { kind: 'fork', label: 'From a version' },
] as const;

/** Sizing begins at what the specification says: its design λ, and the chord limit among its requirements as the cap. */
export function sizedDefaults(
  { specification: { specification, requirements } }: Programme,
  airfoilIds: string[],
) {
  return {
    kind: 'sized' as const,
    airfoilIds,
    tipSpeedRatio: specification.designTipSpeedRatio,
    designLift: 1,
    maxChordM: requirements.find(({ kind }) => kind === 'max-chord')?.limit ?? null,
    stationCount: 15,
  };
}
