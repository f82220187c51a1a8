import { z } from 'zod';

/** Cursor pagination: `cursor` of the next page comes with the answer, null on the last. */
export const pageQuery = z.object({
  cursor: z.string().max(200, 'allowed: at most 200 characters').optional(),
  limit: z.coerce
    .number()
    .int('allowed: a whole number')
    .min(1, 'allowed: 1 to 200')
    .max(200, 'allowed: 1 to 200')
    .default(50),
});
export const page = <T extends z.ZodType>(item: T) =>
  z.object({ items: z.array(item), nextCursor: z.string().nullable() });
export const list = <T extends z.ZodType>(item: T) => z.object({ items: z.array(item) });
