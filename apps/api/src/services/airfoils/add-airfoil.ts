import type { Airfoil, AirfoilInput } from '@tipward/contract';
import { UniqueConstraintError } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { conflict, forbidden } from '../../http/app-error.ts';
import { AirfoilRecord } from '../../models/airfoil-record.ts';
import type { Actor } from '../../policies/actor.ts';
import { canAddAirfoil } from '../../policies/programmes.ts';
import { presentAirfoil } from '../../presenters/airfoil.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';
import { hashPolarSet } from './hash-polar-set.ts';

/** Adds an airfoil for good. @throws AppError `conflict` when the name is taken */
export async function addAirfoil(context: Context, actor: Actor, given: AirfoilInput): Promise<Airfoil> {
  if (!canAddAirfoil(actor)) throw forbidden('Only aerodynamicists and leads add airfoils.');
  try {
    const row = await inTransaction(context, async (transaction) => {
      const added = await AirfoilRecord.create(
        { ...given, polarSetHash: hashPolarSet(given), addedBy: actor.personId },
        { transaction },
      );
      await writeAudit(context, transaction, {
        actorId: actor.personId,
        action: 'airfoils.added',
        subjectKind: 'airfoil',
        subjectId: added.id,
        detail: { name: added.name, polarSetHash: added.polarSetHash },
      });
      return added;
    });
    return presentAirfoil(row, await loadPersonRefs([row.addedBy]));
  } catch (error) {
    if (error instanceof UniqueConstraintError)
      throw conflict(
        'An airfoil of this name exists already; airfoils never change, so give this one its own name.',
      );
    throw error;
  }
}
