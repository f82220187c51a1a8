import { SolverInputError } from '../input-error.ts';

export const HIGH_INDUCTION = ['buhl', 'glauert', 'straight-tangent'] as const;
export type HighInduction = (typeof HIGH_INDUCTION)[number];

export interface SolverOptions {
  readonly tipLoss: boolean;
  readonly hubLoss: boolean;
  /** Drag takes part in both inductions. */
  readonly dragInInduction: boolean;
  readonly highInduction: HighInduction;
}

export const DEFAULT_OPTIONS: SolverOptions = {
  tipLoss: true,
  hubLoss: true,
  dragInInduction: true,
  highInduction: 'buhl',
};

/** Options with defaults filled in; unknown names and wrong values are refused, never repaired. */
export function resolveOptions(given: Partial<SolverOptions> = {}): SolverOptions {
  for (const [name, value] of Object.entries(given)) {
    if (!(name in DEFAULT_OPTIONS))
      throw new SolverInputError(`options.${name}`, value, Object.keys(DEFAULT_OPTIONS).join(', '));
    if (
      name === 'highInduction' ? !HIGH_INDUCTION.includes(value as HighInduction) : typeof value !== 'boolean'
    )
      throw new SolverInputError(
        `options.${name}`,
        value,
        name === 'highInduction' ? HIGH_INDUCTION.join(', ') : 'true or false',
      );
  }
  return { ...DEFAULT_OPTIONS, ...given };
}
