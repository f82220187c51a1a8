import type { Transaction } from 'sequelize';
import { notFound } from '../../http/app-error.ts';
import { Design } from '../../models/design.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeWork } from '../../policies/programmes.ts';

/** A design the actor works on. @throws AppError `not-found`, also for one they may not know of */
export async function findDesign(actor: Actor, designId: string, transaction?: Transaction): Promise<Design> {
  const design = await Design.findByPk(designId, transaction === undefined ? {} : { transaction });
  if (design === null || !canSeeWork(actor, { programmeId: design.programmeId }))
    throw notFound('This design');
  return design;
}
