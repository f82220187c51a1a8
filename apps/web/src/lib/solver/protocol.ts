import type { DesignContent, Evaluation, Requirement, Specification } from '@tipward/contract';
import type { AirfoilData, LiveResult } from '@tipward/design-model';

/** What stays the same from key to key; sent once, so that a key sends only the content. */
export interface SolverContext {
  readonly specification: Specification;
  readonly specificationHash: string;
  readonly requirements: readonly Requirement[];
  readonly airfoils: readonly AirfoilData[];
}

/** Every call the worker answers: what goes in and what comes out. `key` names the context it is held against. */
export interface SolverCalls {
  setContext: { input: { key: string; context: SolverContext }; output: null };
  /** Solves once and throws the result away, so that the next edit meets compiled code. Milliseconds taken. */
  warmUp: { input: { key: string; content: DesignContent }; output: number };
  solveLive: {
    input: { key: string; content: DesignContent; tipSpeedRatio: number | null };
    output: LiveResult;
  };
  evaluate: { input: { key: string; content: DesignContent }; output: Evaluation };
  retwist: { input: { key: string; content: DesignContent }; output: DesignContent };
}
export type SolverCall = keyof SolverCalls;

export type SolverRequest = {
  [C in SolverCall]: { readonly serial: number; readonly call: C; readonly input: SolverCalls[C]['input'] };
}[SolverCall];

export type SolverReply =
  | { readonly serial: number; readonly ok: true; readonly output: SolverCalls[SolverCall]['output'] }
  | { readonly serial: number; readonly ok: false; readonly message: string };
