import { runProgram } from './commands/run-program.ts';
import { readConfig } from './config/read-config.ts';
import { closeContext, createContext } from './context.ts';
import { startWorker } from './jobs/start-worker.ts';
import { untilStopped } from './until-stopped.ts';

runProgram(async () => {
  const context = createContext(readConfig(process.env));
  const worker = await startWorker(context);
  context.log.info('working on jobs');
  await untilStopped();
  await worker.stop();
  await closeContext(context);
  return 0;
});
