import type { DesignContent, Evaluation } from '@tipward/contract';

/** A blade with what the solver says of it, as pages show and compare it. */
export interface RecordedItem {
  readonly id: string;
  /** Short: 'v3', 'draft', 'A'. */
  readonly label: string;
  readonly content: DesignContent;
  readonly evaluation: Evaluation;
  /** Place in the series colours, fixed by order of the page. */
  readonly colorIndex: number;
}
