import {
  createDesign,
  discardDraft,
  evaluateContent,
  getDesign,
  getDraft,
  getVersion,
  listDesigns,
  listDrafts,
  listVersions,
  openDraft,
  renameDesign,
  saveDraft,
  saveVersion,
} from '@tipward/contract';
import { designContentWith, makeAirfoil, makeDesign, someId } from '../factories.ts';
import { makeVersion, startWork } from '../work.ts';
import { row, statuses } from './rights-row.ts';
import type { World } from './world.ts';

/** Those who do the work see it; to everyone else it does not exist. */
const work = (status: number) => statuses(401, 404, status, status, 404, 404);
/** A draft of the aerodynamicist's: nobody else's business. */
const own = (status: number) => statuses(401, 404, status, 404, 404, 404);

const design = async ({ programme, people }: World) => {
  const made = await makeDesign(programme, people.aerodynamicist, `Design ${someId()}`);
  return { params: { designId: made.id } };
};
const draft = async ({ api, programme, people }: World) => {
  const made = await startWork(api, programme, people.aerodynamicist);
  return { params: { draftId: made.id }, ifMatch: `"${made.revision}"`, content: made.content };
};
const version = async ({ api, programme, people }: World) =>
  makeVersion(api, programme, people.aerodynamicist);
const here = ({ programme }: World) => ({ params: { programmeId: programme.id } });

export const designRights = [
  row(listDesigns, work(200), here),
  row(createDesign, statuses(401, 403, 201, 201, 403, 404), (world) => ({
    ...here(world),
    body: { name: `Design ${someId()}`, start: { kind: 'stations', airfoilIds: [], stations: [] } },
  })),
  row(getDesign, work(200), design),
  row(renameDesign, work(200), async (world) => ({
    ...(await design(world)),
    body: { name: `Design ${someId()}` },
    ifMatch: '"1"',
  })),
  row(evaluateContent, work(200), async (world) => ({
    ...here(world),
    body: { content: designContentWith([await makeAirfoil(world.people.lead)]) },
  })),
  row(listDrafts, statuses(401, 200, 200, 200, 200, 200)),
  row(openDraft, work(201), async (world) => {
    const { id, designId } = await version(world);
    return { params: { designId }, body: { fromVersionId: id } };
  }),
  row(getDraft, own(200), async (world) => ({ params: (await draft(world)).params })),
  row(saveDraft, own(200), async (world) => {
    const { content, ...request } = await draft(world);
    return { ...request, body: { content } };
  }),
  row(discardDraft, own(204), async (world) => {
    const { params, ifMatch } = await draft(world);
    return { params, ifMatch };
  }),
  row(saveVersion, own(201), async (world) => {
    const { params, ifMatch } = await draft(world);
    return { params, ifMatch, body: { note: 'A version' } };
  }),
  row(listVersions, work(200), here),
  row(getVersion, work(200), async (world) => ({ params: { versionId: (await version(world)).id } })),
];
