import type { DesignContent, Release, Review, Version } from '@tipward/contract';
import { toDraft } from '@tipward/design-model';
import type { Draft as DraftView } from '@tipward/contract';
import type { Person } from '../src/models/person.ts';
import type { Programme } from '../src/models/programme.ts';
import type { Actor } from '../src/policies/actor.ts';
import { loadActor } from '../src/services/auth/load-actor.ts';
import { createDesign } from '../src/services/designs/create-design.ts';
import { getDraft } from '../src/services/drafts/get-draft.ts';
import { openDraft } from '../src/services/drafts/open-draft.ts';
import { saveDraft } from '../src/services/drafts/save-draft.ts';
import { releaseVersion } from '../src/services/releases/release-version.ts';
import { askForReview } from '../src/services/reviews/ask-for-review.ts';
import { decideReview } from '../src/services/reviews/decide-review.ts';
import { saveVersion } from '../src/services/versions/save-version.ts';
import { designContentWith, makeAirfoil, PASSWORD, someId } from './factories.ts';
import type { TestApi } from './test-api.ts';

export async function actorOf(person: Person): Promise<Actor> {
  const actor = await loadActor(person.id);
  if (actor === null) throw new Error(`${person.name} may not act`);
  return actor;
}

/** A design of the programme with its first draft, which holds a content that can be saved as a version. */
export async function startWork(api: TestApi, programme: Programme, author: Person): Promise<DraftView> {
  const foil = await makeAirfoil(author);
  const content = designContentWith([foil]);
  const actor = await actorOf(author);
  const { draft } = await createDesign(api.context, actor, programme.id, {
    name: `Design ${someId()}`,
    start: { kind: 'stations', airfoilIds: [foil.id], stations: toDraft(content).stations },
  });
  return draft;
}

export async function makeVersion(api: TestApi, programme: Programme, author: Person): Promise<Version> {
  const draft = await startWork(api, programme, author);
  return saveVersion(api.context, await actorOf(author), draft.id, 'First version', `"${draft.revision}"`);
}

/** The next version of a design, changed from the one before. */
export async function makeNextVersion(
  api: TestApi,
  before: Version,
  author: Person,
  change: (content: DesignContent) => DesignContent,
): Promise<Version> {
  const actor = await actorOf(author);
  const { view } = await openDraft(api.context, actor, before.designId, before.id);
  await saveDraft(api.context, actor, view.id, toDraft(change(before.content)), `"${view.revision}"`);
  const { etag } = await getDraft(actor, view.id);
  return saveVersion(api.context, actor, view.id, 'Changed', etag);
}

export async function makeReview(api: TestApi, version: Version, author: Person): Promise<Review> {
  return askForReview(api.context, await actorOf(author), version.id, 'Please look at it');
}

export async function approve(api: TestApi, review: Review, lead: Person): Promise<Review> {
  const { contentHash, specificationHash } = review;
  return decideReview(api.context, await actorOf(lead), review.id, {
    outcome: 'approved',
    note: '',
    password: PASSWORD,
    contentHash,
    specificationHash,
  });
}

export async function makeApproved(
  api: TestApi,
  programme: Programme,
  author: Person,
  lead: Person,
): Promise<Version> {
  const version = await makeVersion(api, programme, author);
  await approve(api, await makeReview(api, version, author), lead);
  return version;
}

export async function makeRelease(
  api: TestApi,
  programme: Programme,
  author: Person,
  lead: Person,
): Promise<Release> {
  const version = await makeApproved(api, programme, author, lead);
  return releaseVersion(api.context, await actorOf(lead), version.id, {
    effectivity: 'From turbine 1',
    note: '',
    password: PASSWORD,
  });
}
