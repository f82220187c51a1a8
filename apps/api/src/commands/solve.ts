import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { CaseError, readCase, solveCase } from './solve-case.ts';

async function readAll(stream: NodeJS.ReadStream): Promise<string> {
  const chunks: Buffer[] = [];
  for await (const chunk of stream) chunks.push(chunk as Buffer);
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(chunks));
  } catch (error) {
    if (!(error instanceof TypeError)) throw error;
    throw new CaseError(['the text is not UTF-8']);
  }
}

/** Reads a case from stdin and writes its result to stdout. Exit code 0, or 2 with what is wrong on stderr. */
async function run(): Promise<void> {
  const given = readCase(await readAll(process.stdin));
  // pipeline asks for the next point only when stdout has taken the one before.
  await pipeline(Readable.from(solveCase(given)), process.stdout, { end: false });
}

run().catch((error: unknown) => {
  // Whoever read the output has seen enough (`solve < case.json | head`).
  if (error instanceof Error && 'code' in error && error.code === 'EPIPE') process.exit(0);
  process.stderr.write(`${error instanceof CaseError ? error.message : String(error)}\n`);
  process.exitCode = 2;
});
