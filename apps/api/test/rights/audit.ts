import { listAuditEvents, verifyAudit } from '@tipward/contract';
import { row, statuses } from './rights-row.ts';

const administratorOnly = statuses(401, 200, 403, 403, 403, 403);

export const auditRights = [row(listAuditEvents, administratorOnly), row(verifyAudit, administratorOnly)];
