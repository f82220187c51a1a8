import type {
  BodyOf,
  issueSpecification as operation,
  SpecificationIssue as IssueView,
} from '@tipward/contract';
import type { Transaction } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { conflict, forbidden } from '../../http/app-error.ts';
import { Programme } from '../../models/programme.ts';
import { SpecificationIssue } from '../../models/specification-issue.ts';
import type { Actor } from '../../policies/actor.ts';
import { canLead } from '../../policies/programmes.ts';
import { presentSpecificationIssue } from '../../presenters/specification-issue.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';
import { findProgramme } from './get-programme.ts';
import { hashSpecification } from './hash-specification.ts';

type Given = BodyOf<typeof operation>;

async function write(transaction: Transaction, actor: Actor, programmeId: string, given: Given) {
  // The row of the programme is the queue in which its issues are numbered.
  await Programme.findByPk(programmeId, { transaction, lock: transaction.LOCK.UPDATE });
  const latest = await SpecificationIssue.max<number, SpecificationIssue>('issue', {
    where: { programmeId },
    transaction,
  });
  if (latest !== given.afterIssue)
    throw conflict(`Issue ${latest} was made in the meantime; look at it, then issue again after it.`);
  const { note, specification, requirements } = given;
  const specificationHash = hashSpecification(specification, requirements);
  const issue = await SpecificationIssue.create(
    {
      programmeId,
      issue: latest + 1,
      note,
      specification,
      requirements,
      specificationHash,
      issuedBy: actor.personId,
    },
    { transaction },
  );
  await Programme.update({ updatedAt: new Date() }, { where: { id: programmeId }, transaction });
  return issue;
}

/** Issues the specification anew. @throws AppError `conflict` when another issue came first */
export async function issueSpecification(
  context: Context,
  actor: Actor,
  programmeId: string,
  given: Given,
): Promise<IssueView> {
  await findProgramme(actor, programmeId);
  if (!canLead(actor, { programmeId }))
    throw forbidden('Only a lead of the programme issues its specification.');
  const issue = await inTransaction(context, async (transaction) => {
    const written = await write(transaction, actor, programmeId, given);
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'programmes.specification-issued',
      subjectKind: 'specification-issue',
      subjectId: written.id,
      programmeId,
      detail: { issue: written.issue, note: given.note, specificationHash: written.specificationHash },
    });
    return written;
  });
  return presentSpecificationIssue(issue, await loadPersonRefs([actor.personId]));
}
