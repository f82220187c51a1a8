import { listAuditEvents } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listAuditEvents as list } from '../../services/audit/list-audit-events.ts';

export const listAuditEventsRoute = route(listAuditEvents, ({ query }) => list(query));
