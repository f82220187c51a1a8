import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import {
  closeContext,
  createApp,
  createPerson,
  isEmptyInstallation,
  openSeeding,
} from '@tipward/api/seeding';
import { PersonAtWork } from './person-at-work.ts';
import type { DemoPerson } from './scenario/people.ts';
import { PEOPLE, signInTable } from './scenario/people.ts';
import { tellStory } from './scenario/story.ts';

const WHO = Object.keys(PEOPLE) as DemoPerson[];

/** Builds the demo once, through the same requests people make; prints the sign-ins. */
async function seedDemo(): Promise<void> {
  const context = openSeeding({ ...process.env, TIPWARD_LOG_LEVEL: 'error' });
  try {
    if (await isEmptyInstallation()) {
      const server = createServer(createApp(context));
      await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
      const origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
      try {
        await build(context, origin);
      } finally {
        server.close();
        server.closeAllConnections();
      }
    }
    process.stdout.write(`${signInTable()}\n`);
  } finally {
    await closeContext(context);
  }
}

async function build(context: ReturnType<typeof openSeeding>, origin: string): Promise<void> {
  const ids: Partial<Record<DemoPerson, string>> = {};
  const at: Partial<Record<DemoPerson, PersonAtWork>> = {};
  for (const who of WHO) {
    const { name, email, password } = PEOPLE[who];
    ids[who] = (await createPerson(context, { name, email, password, isAdministrator: who === 'wren' })).id;
    at[who] = await PersonAtWork.signIn(origin, context.config.publicUrl, email, password);
  }
  await tellStory({ ids: ids as Record<DemoPerson, string>, at: at as Record<DemoPerson, PersonAtWork> });
}

seedDemo().catch((error: unknown) => {
  process.stderr.write(
    `The demo could not be built: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`,
  );
  process.stderr.write('What was begun stays; `npm run reset-demo` starts over.\n');
  process.exitCode = 1;
});
