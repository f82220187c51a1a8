import { getHealth } from '@tipward/contract';
import { publicRoute } from '../../http/route.ts';
import { checkHealth } from '../../services/system/check-health.ts';

export const getHealthRoute = publicRoute(getHealth, ({ context }) => checkHealth(context));
