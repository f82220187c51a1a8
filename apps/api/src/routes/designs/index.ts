import { listDesignsRoute } from './list-designs.ts';
import { createDesignRoute } from './create-design.ts';
import { getDesignRoute } from './get-design.ts';
import { renameDesignRoute } from './rename-design.ts';
import { evaluateContentRoute } from './evaluate-content.ts';

export const designRoutes = [
  listDesignsRoute,
  createDesignRoute,
  getDesignRoute,
  renameDesignRoute,
  evaluateContentRoute,
];
