import { listAuditEventsRoute } from './list-audit-events.ts';
import { verifyAuditRoute } from './verify-audit.ts';

export const auditRoutes = [listAuditEventsRoute, verifyAuditRoute];
