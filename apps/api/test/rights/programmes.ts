import {
  createProgramme,
  getProgramme,
  issueSpecification,
  listProgrammes,
  listSpecifications,
  updateProgramme,
} from '@tipward/contract';
import { SpecificationIssue } from '../../src/models/specification-issue.ts';
import { REQUIREMENTS, someId, SPECIFICATION } from '../factories.ts';
import { row, statuses } from './rights-row.ts';
import type { World } from './world.ts';

const here = ({ programme }: World) => ({ params: { programmeId: programme.id } });
const content = { specification: SPECIFICATION, requirements: REQUIREMENTS };

export const programmeRights = [
  row(listProgrammes, statuses(401, 200, 200, 200, 200, 200)),
  row(createProgramme, statuses(401, 201, 403, 201, 403, 403), () => ({
    body: { name: `Programme ${someId()}`, summary: '', ...content },
  })),
  row(getProgramme, statuses(401, 200, 200, 200, 200, 404), here),
  row(updateProgramme, statuses(401, 403, 403, 200, 403, 404), async ({ programme }) => {
    await programme.reload();
    return {
      params: { programmeId: programme.id },
      body: { name: programme.name, summary: 'Described anew' },
      ifMatch: `"${programme.revision}"`,
    };
  }),
  row(listSpecifications, statuses(401, 200, 200, 200, 200, 404), here),
  row(issueSpecification, statuses(401, 403, 403, 201, 403, 404), async ({ programme }) => ({
    params: { programmeId: programme.id },
    body: {
      afterIssue: await SpecificationIssue.count({ where: { programmeId: programme.id } }),
      note: 'Issued anew',
      ...content,
    },
  })),
];
