import type { BodyOf, Release as ReleaseView, releaseVersion as operation } from '@tipward/contract';
import type { Transaction } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { buildPackage } from '../../export/build-package.ts';
import { conflict, forbidden } from '../../http/app-error.ts';
import { versionReleasedLetter } from '../../mail/templates/version-released.ts';
import { Decision } from '../../models/decision.ts';
import { Programme } from '../../models/programme.ts';
import { Release } from '../../models/release.ts';
import type { Actor } from '../../policies/actor.ts';
import { canLead } from '../../policies/programmes.ts';
import { versionLabel, type VersionParts } from '../../presenters/version.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { confirmPassword } from '../auth/confirm-password.ts';
import { writeMail } from '../mail/write-mail.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';
import { addressesOf } from '../reviews/concerned.ts';
import { findVersion } from '../versions/find-version.ts';
import { getRelease } from './get-release.ts';
import { releaseLetter } from './release-letter.ts';

type Given = BodyOf<typeof operation>;

async function approvalOf(versionId: string, transaction: Transaction): Promise<Decision> {
  const decision = await Decision.findOne({
    where: { versionId, outcome: 'approved' },
    order: [['decidedAt', 'DESC']],
    transaction,
  });
  if (decision === null) throw conflict('Only an approved version is released.');
  return decision;
}

/** Writes the release in the transaction; the programme's row is the queue for letters. */
async function write(
  actor: Actor,
  versionId: string,
  given: Given,
  transaction: Transaction,
): Promise<{ release: Release; parts: VersionParts; before: Release | null }> {
  const { programmeId } = await findVersion(actor, versionId, transaction);
  await Programme.findByPk(programmeId, { transaction, lock: transaction.LOCK.UPDATE });
  const parts = await findVersion(actor, versionId, transaction);
  if (parts.state.state !== 'approved')
    throw conflict(
      `This version is ${parts.state.state.replace('-', ' ')}; only an approved version is released.`,
    );
  const decision = await approvalOf(versionId, transaction);
  const before = await Release.findOne({
    where: { programmeId },
    order: [['sequence', 'DESC']],
    attributes: { exclude: ['package'] },
    transaction,
  });
  const sequence = (before?.sequence ?? 0) + 1;
  const ref = await loadPersonRefs([decision.decidedBy, actor.personId]);
  const releasedAt = new Date();
  const built = await buildPackage({
    programmeName: parts.programmeName,
    designName: parts.designName,
    versionLabel: versionLabel(parts.version.number),
    letter: releaseLetter(sequence),
    effectivity: given.effectivity,
    note: given.note,
    content: parts.version.content,
    contentHash: parts.version.contentHash,
    specificationHash: parts.version.specificationHash,
    evaluation: parts.evaluation,
    approvedBy: ref(decision.decidedBy),
    approvedAt: decision.decidedAt.toISOString(),
    releasedBy: ref(actor.personId),
    releasedAt: releasedAt.toISOString(),
  });
  const release = await Release.create(
    {
      programmeId,
      versionId,
      sequence,
      letter: releaseLetter(sequence),
      effectivity: given.effectivity,
      note: given.note,
      package: built.bytes,
      packageSha256: built.sha256,
      packageBytes: built.bytes.length,
      manifest: built.manifest,
      releasedBy: actor.personId,
      releasedAt,
    },
    { transaction },
  );
  return { release, parts, before };
}

/**
 * Releases an approved version of someone else's with the next letter; the package is built and frozen with it, and the
 * release before is superseded. The lead's password again.
 */
export async function releaseVersion(
  context: Context,
  actor: Actor,
  versionId: string,
  given: Given,
): Promise<ReleaseView> {
  const seen = await findVersion(actor, versionId);
  if (!canLead(actor, seen)) throw forbidden('Only a lead of the programme releases.');
  if (seen.version.authorId === actor.personId) throw forbidden('Nobody releases a version of their own.');
  await confirmPassword(context, actor, given.password);
  const concerned = await addressesOf(seen.programmeId, ['aerodynamicist', 'lead', 'reader'], actor.personId);
  const id = await inTransaction(context, async (transaction) => {
    const { release, parts, before } = await write(actor, versionId, given, transaction);
    const letter = versionReleasedLetter({
      programmeName: parts.programmeName,
      designName: parts.designName,
      versionLabel: versionLabel(parts.version.number),
      letter: release.letter,
      supersedes: before?.letter ?? null,
      effectivity: release.effectivity,
      note: release.note,
      releasedBy: actor.name,
      packageSha256: release.packageSha256,
      link: `${context.config.publicUrl}/releases/${release.id}`,
    });
    await writeMail(transaction, concerned, letter);
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'releases.made',
      subjectKind: 'release',
      subjectId: release.id,
      programmeId: release.programmeId,
      detail: {
        letter: release.letter,
        versionId,
        contentHash: parts.version.contentHash,
        packageSha256: release.packageSha256,
        supersedes: before?.letter ?? null,
      },
    });
    return release.id;
  });
  return getRelease(actor, id);
}
