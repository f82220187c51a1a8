import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import type { Download } from '../../http/route.ts';
import { Release } from '../../models/release.ts';
import type { Actor } from '../../policies/actor.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { findRelease } from './get-release.ts';

const plain = (name: string): string =>
  name
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9]+/gu, '-')
    .replace(/^-+|-+$/gu, '') || 'programme';

/** The frozen package; who took which one is audited. */
export async function downloadPackage(context: Context, actor: Actor, releaseId: string): Promise<Download> {
  const { release, version } = await findRelease(actor, releaseId);
  const row = await Release.findByPk(releaseId, { attributes: ['package'], rejectOnEmpty: true });
  await inTransaction(context, (transaction) =>
    writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'releases.downloaded',
      subjectKind: 'release',
      subjectId: releaseId,
      programmeId: release.programmeId,
      detail: { letter: release.letter, packageSha256: release.packageSha256 },
    }),
  );
  return { bytes: row.package, fileName: `${plain(version.programmeName)}-release-${release.letter}.zip` };
}
