import type { Session } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { canCreateProgramme } from '../../policies/programmes.ts';
import { presentPerson } from '../../presenters/person.ts';
import { loadPerson } from '../people/load-people.ts';
import { csrfTokenOf } from './csrf.ts';
import type { LiveSession } from './find-session.ts';

/** Who is signed in, their CSRF token, and what the installation offers. */
export async function describeSession(context: Context, session: LiveSession | null): Promise<Session> {
  const { config } = context;
  const offers = { mailCatcher: config.mailCatcherPort !== null, demo: config.mode === 'demo' };
  if (session === null) return { person: null, csrfToken: null, canCreateProgramme: false, ...offers };
  return {
    person: presentPerson(await loadPerson(session.actor.personId)),
    csrfToken: csrfTokenOf(context, session.familyId),
    canCreateProgramme: canCreateProgramme(session.actor),
    ...offers,
  };
}
