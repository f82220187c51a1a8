import { z } from 'zod';
import { person } from '../people/person.ts';

/** Who is signed in, and what the installation offers. Null person: nobody. `csrfToken` goes into X-CSRF-Token of every change. */
export const session = z.object({
  person: person.nullable(),
  csrfToken: z.string().nullable(),
  canCreateProgramme: z.boolean(),
  mailCatcher: z.boolean(),
  demo: z.boolean(),
});
export type Session = z.infer<typeof session>;
