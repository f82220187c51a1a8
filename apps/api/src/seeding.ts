/** What the demonstration is built with: the same services that a request goes through. */
import { createContext, type Context } from './context.ts';
import { readConfig } from './config/read-config.ts';
import { ConfigError } from './config/config-error.ts';
import { Person } from './models/person.ts';
import { Programme } from './models/programme.ts';
import { loadActor } from './services/auth/load-actor.ts';
import type { Actor } from './policies/actor.ts';

/**
 * Opens the database of the environment for seeding.
 * @throws ConfigError in production, where no demonstration belongs
 */
export function openSeeding(env: Readonly<Record<string, string | undefined>>): Context {
  const config = readConfig(env);
  if (config.mode === 'production')
    throw new ConfigError(['TIPWARD_MODE is production; allowed for the demonstration: demo, test']);
  return createContext(config);
}

/** Whether anyone or anything is there already: the demonstration goes into an empty installation only. */
export async function isEmptyInstallation(): Promise<boolean> {
  return (await Person.count()) === 0 && (await Programme.count()) === 0;
}

/** A person as they act, with the roles they hold now. @throws Error for someone unknown or disabled */
export async function actAs(personId: string): Promise<Actor> {
  const actor = await loadActor(personId);
  if (actor === null) throw new Error(`person ${personId} may not act`);
  return actor;
}

export { closeContext, type Context } from './context.ts';
export type { Actor } from './policies/actor.ts';
export { createPerson } from './services/people/create-person.ts';
export { setMember } from './services/people/set-member.ts';
export { createProgramme } from './services/programmes/create-programme.ts';
export { issueSpecification } from './services/programmes/issue-specification.ts';
export { addAirfoil } from './services/airfoils/add-airfoil.ts';
export { createApp } from './app.ts';
