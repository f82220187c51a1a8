import { createServer } from 'node:http';
import { createApp } from './app.ts';
import { readConfig } from './config/read-config.ts';
import { runProgram } from './commands/run-program.ts';
import { closeContext, createContext } from './context.ts';
import { CaughtMail } from './mail/caught-mail.ts';
import { startCatcher } from './mail/start-catcher.ts';
import { untilStopped } from './until-stopped.ts';

runProgram(async () => {
  const config = readConfig(process.env);
  const caughtMail = config.mailCatcherPort === null ? null : new CaughtMail();
  const context = createContext(config, caughtMail);
  const catcher =
    caughtMail === null || config.mailCatcherPort === null
      ? null
      : await startCatcher(caughtMail, config.mailCatcherPort);
  const server = createServer(createApp(context));
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(config.port, config.host, resolve);
  });
  context.log.info(`serving ${config.publicUrl} on ${config.host}:${config.port}`);
  await untilStopped();
  server.close();
  server.closeAllConnections();
  await catcher?.stop();
  await closeContext(context);
  return 0;
});
