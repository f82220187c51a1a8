import { getHealth, getOpenapi, listCaughtMail } from '@tipward/contract';
import { row, statuses } from './rights-row.ts';

const everyone = (status: number) => statuses(status, status, status, status, status, status);

export const systemRights = [
  row(getHealth, everyone(200)),
  row(getOpenapi, everyone(200)),
  // The API of the rights test catches no mail, so the address does not exist.
  row(listCaughtMail, everyone(404)),
];
