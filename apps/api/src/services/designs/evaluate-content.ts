import type { DesignContent, Evaluation } from '@tipward/contract';
import { notFound } from '../../http/app-error.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeWork } from '../../policies/programmes.ts';
import { evaluate } from './evaluate.ts';
import { loadInputs } from './load-inputs.ts';

/** Evaluates a design without saving it. */
export async function evaluateUnsaved(
  actor: Actor,
  programmeId: string,
  content: DesignContent,
): Promise<Evaluation> {
  if (!canSeeWork(actor, { programmeId })) throw notFound('This programme');
  return evaluate(content, await loadInputs(programmeId, content));
}
