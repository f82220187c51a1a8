import { verifyAudit } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { verifyAudit as verify } from '../../services/audit/verify-audit.ts';

export const verifyAuditRoute = route(verifyAudit, () => verify());
