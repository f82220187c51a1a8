import { getOpenapi, operations } from '@tipward/contract';
import { publicRoute } from '../../http/route.ts';
import { openapiDocument } from '../../services/system/openapi-document.ts';

let document: Record<string, unknown> | null = null;

export const getOpenapiRoute = publicRoute(getOpenapi, () => {
  document ??= openapiDocument(operations);
  return Promise.resolve(document);
});
