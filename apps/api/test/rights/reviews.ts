import {
  addComment,
  askForReview,
  decideReview,
  downloadPackage,
  getRelease,
  getReview,
  listReleases,
  listReviews,
  releaseVersion,
  resolveComment,
  withdrawReview,
} from '@tipward/contract';
import { addComment as writeComment } from '../../src/services/reviews/add-comment.ts';
import { PASSWORD } from '../factories.ts';
import { actorOf, makeApproved, makeRelease, makeReview, makeVersion } from '../work.ts';
import { row, statuses } from './rights-row.ts';
import type { World } from './world.ts';

const work = (status: number) => statuses(401, 404, status, status, 404, 404);
/** Releases are read by every member and by administrators. */
const released = (status: number) => statuses(401, status, status, status, status, 404);

const version = async ({ api, programme, people }: World) =>
  makeVersion(api, programme, people.aerodynamicist);
const review = async (world: World) =>
  makeReview(world.api, await version(world), world.people.aerodynamicist);
const release = async ({ api, programme, people }: World) => ({
  params: { releaseId: (await makeRelease(api, programme, people.aerodynamicist, people.lead)).id },
});

export const reviewRights = [
  row(listReviews, statuses(401, 200, 200, 200, 200, 200)),
  row(askForReview, statuses(401, 404, 201, 403, 404, 404), async (world) => ({
    params: { versionId: (await version(world)).id },
    body: { message: '' },
  })),
  row(getReview, work(200), async (world) => ({ params: { reviewId: (await review(world)).id } })),
  row(addComment, work(201), async (world) => ({
    params: { reviewId: (await review(world)).id },
    body: { text: 'A comment' },
  })),
  row(resolveComment, work(200), async (world) => {
    const { id } = await review(world);
    const comment = await writeComment(world.api.context, await actorOf(world.people.aerodynamicist), id, {
      text: 'A comment',
      stationRadiusM: null,
      replyTo: null,
    });
    return { params: { commentId: comment.id } };
  }),
  // The author of the version is the aerodynamicist, who may see the review but not sign it.
  row(decideReview, statuses(401, 404, 403, 201, 404, 404), async (world) => {
    const { id, contentHash, specificationHash } = await review(world);
    const body = { outcome: 'approved', note: '', password: PASSWORD, contentHash, specificationHash };
    return { params: { reviewId: id }, body };
  }),
  row(withdrawReview, statuses(401, 404, 200, 403, 404, 404), async (world) => ({
    params: { reviewId: (await review(world)).id },
  })),
  row(releaseVersion, statuses(401, 404, 403, 201, 404, 404), async ({ api, programme, people }) => ({
    params: { versionId: (await makeApproved(api, programme, people.aerodynamicist, people.lead)).id },
    body: { effectivity: 'From turbine 1', note: '', password: PASSWORD },
  })),
  row(listReleases, released(200), ({ programme }) => ({ params: { programmeId: programme.id } })),
  row(getRelease, released(200), release),
  row(downloadPackage, released(200), release),
];
