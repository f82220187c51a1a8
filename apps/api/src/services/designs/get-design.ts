import type { Design as DesignView } from '@tipward/contract';
import { notFound } from '../../http/app-error.ts';
import { revisionETag } from '../../http/etag.ts';
import { Programme } from '../../models/programme.ts';
import type { Actor } from '../../policies/actor.ts';
import { canAuthor } from '../../policies/programmes.ts';
import { presentDesign } from '../../presenters/design.ts';
import { presentDraftSummary } from '../../presenters/draft.ts';
import { gatherDrafts } from '../drafts/gather-drafts.ts';
import { findDesign } from './find-design.ts';
import { gatherDesigns } from './gather-designs.ts';

export interface DesignWithETag {
  readonly view: DesignView;
  readonly etag: string;
}

export async function getDesign(actor: Actor, designId: string): Promise<DesignWithETag> {
  const design = await findDesign(actor, designId);
  const [[parts], drafts, programme] = await Promise.all([
    gatherDesigns({ id: designId }),
    gatherDrafts({ designId, authorId: actor.personId }),
    Programme.findByPk(design.programmeId),
  ]);
  if (parts === undefined || programme === null) throw notFound('This design');
  const may = canAuthor(actor, design);
  const view = presentDesign(parts, programme.name, drafts.map(presentDraftSummary), {
    rename: may,
    openDraft: may,
  });
  return { view, etag: revisionETag(design.revision) };
}
