import { parseArgs } from 'node:util';
import { emailAddress, nameText } from '@tipward/contract';
import { z } from 'zod';
import { ConfigError } from '../config/config-error.ts';
import { readConfig } from '../config/read-config.ts';
import { closeContext, createContext } from '../context.ts';
import { inviteFirstAdministrator } from '../services/people/invite-first-administrator.ts';
import { runProgram } from './run-program.ts';

const given = z.object({ email: emailAddress, name: nameText('Name') });

/** Lets the first person into an empty installation: `invite-administrator --email … --name …` prints their link. */
runProgram(async () => {
  const { values } = parseArgs({ options: { email: { type: 'string' }, name: { type: 'string' } } });
  const parsed = given.safeParse(values);
  if (!parsed.success) throw new ConfigError(parsed.error.issues.map(({ message }) => message));
  const context = createContext(readConfig(process.env));
  try {
    const link = await inviteFirstAdministrator(context, parsed.data);
    process.stdout.write(`Open this link within seven days to set the password:\n${link}\n`);
  } finally {
    await closeContext(context);
  }
  return 0;
});
