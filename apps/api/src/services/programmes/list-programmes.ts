import type { ProgrammeSummary } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { Programme } from '../../models/programme.ts';
import type { Actor } from '../../policies/actor.ts';
import { presentProgrammeSummary } from '../../presenters/programme.ts';
import { gatherProgrammes } from './gather-programmes.ts';

/** Programmes the actor belongs to, all of them for an administrator; by name. */
export async function listProgrammes(context: Context, actor: Actor): Promise<{ items: ProgrammeSummary[] }> {
  const programmes = await Programme.findAll({
    where: actor.isAdministrator ? {} : { id: [...actor.roles.keys()] },
    order: ['name', 'id'],
  });
  const parts = await gatherProgrammes(context, actor, programmes);
  return { items: parts.map((each) => presentProgrammeSummary(actor, each)) };
}
