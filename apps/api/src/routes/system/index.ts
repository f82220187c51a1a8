import { getHealthRoute } from './get-health.ts';
import { getOpenapiRoute } from './get-openapi.ts';

export const systemRoutes = [getHealthRoute, getOpenapiRoute];
