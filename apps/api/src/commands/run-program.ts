import { ConfigError } from '../config/config-error.ts';

/** A failure of the surroundings, put so that whoever started the program can act on it. */
function readable(error: unknown): string {
  if (error instanceof ConfigError) return error.message;
  const code = error instanceof Error && 'code' in error ? String(error.code) : '';
  if (code === 'EADDRINUSE') return `The port is taken: ${(error as Error).message}`;
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
}

/** Runs a program to its exit code; a failure is printed on stderr and ends it with 2. */
export function runProgram(program: () => Promise<number>): void {
  program().then(
    (code) => {
      process.exitCode = code;
    },
    (error: unknown) => {
      process.stderr.write(`${readable(error)}\n`);
      process.exit(2);
    },
  );
}
