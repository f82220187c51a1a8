import type { Evaluation, RotorCurve, Warning } from '@tipward/contract';

/** What answers while a person types. */
export interface LiveResult {
  readonly curve: RotorCurve;
  readonly maxCp: number | null;
  readonly tipSpeedRatioAtMaxCp: number | null;
  readonly ctAtMaxCp: number | null;
  readonly span: Evaluation['span'];
  readonly warnings: Warning[];
}
