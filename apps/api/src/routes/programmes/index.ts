import { createProgrammeRoute } from './create-programme.ts';
import { getProgrammeRoute } from './get-programme.ts';
import { issueSpecificationRoute } from './issue-specification.ts';
import { listProgrammesRoute } from './list-programmes.ts';
import { listSpecificationsRoute } from './list-specifications.ts';
import { updateProgrammeRoute } from './update-programme.ts';

export const programmeRoutes = [
  listProgrammesRoute,
  createProgrammeRoute,
  getProgrammeRoute,
  updateProgrammeRoute,
  listSpecificationsRoute,
  issueSpecificationRoute,
];
