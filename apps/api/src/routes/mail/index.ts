import { listCaughtMailRoute } from './list-caught-mail.ts';

export const mailRoutes = [listCaughtMailRoute];
