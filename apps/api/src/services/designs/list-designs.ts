import type { DesignSummary } from '@tipward/contract';
import { notFound } from '../../http/app-error.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeWork } from '../../policies/programmes.ts';
import { presentDesignSummary } from '../../presenters/design.ts';
import { gatherDesigns } from './gather-designs.ts';

export async function listDesigns(actor: Actor, programmeId: string): Promise<{ items: DesignSummary[] }> {
  if (!canSeeWork(actor, { programmeId })) throw notFound('This programme');
  return { items: (await gatherDesigns({ programmeId })).map(presentDesignSummary) };
}
