import type { BodyOf, createProgramme as operation } from '@tipward/contract';
import { UniqueConstraintError, type Transaction } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { conflict, forbidden } from '../../http/app-error.ts';
import { Membership } from '../../models/membership.ts';
import { Programme } from '../../models/programme.ts';
import { SpecificationIssue } from '../../models/specification-issue.ts';
import type { Actor } from '../../policies/actor.ts';
import { canCreateProgramme } from '../../policies/programmes.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { getProgramme, type ProgrammeWithETag } from './get-programme.ts';
import { hashSpecification } from './hash-specification.ts';

type Given = BodyOf<typeof operation>;

export const nameTaken = () => conflict('A programme of this name exists already; choose another name.');

async function write(transaction: Transaction, actor: Actor, given: Given): Promise<Programme> {
  const { name, summary, specification, requirements } = given;
  const programme = await Programme.create({ name, summary, createdBy: actor.personId }, { transaction });
  await SpecificationIssue.create(
    {
      programmeId: programme.id,
      issue: 1,
      note: 'First issue',
      specification,
      requirements,
      specificationHash: hashSpecification(specification, requirements),
      issuedBy: actor.personId,
    },
    { transaction },
  );
  await Membership.create(
    { programmeId: programme.id, personId: actor.personId, role: 'lead' },
    { transaction },
  );
  return programme;
}

/** Creates a programme with issue 1 of its specification; the actor becomes its lead. */
export async function createProgramme(
  context: Context,
  actor: Actor,
  given: Given,
): Promise<ProgrammeWithETag> {
  if (!canCreateProgramme(actor)) throw forbidden('Only leads and administrators create programmes.');
  try {
    const id = await inTransaction(context, async (transaction) => {
      const programme = await write(transaction, actor, given);
      await writeAudit(context, transaction, {
        actorId: actor.personId,
        action: 'programmes.created',
        subjectKind: 'programme',
        subjectId: programme.id,
        programmeId: programme.id,
        detail: { name: given.name },
      });
      return programme.id;
    });
    return await getProgramme(context, { ...actor, roles: new Map(actor.roles).set(id, 'lead') }, id);
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw nameTaken();
    throw error;
  }
}
