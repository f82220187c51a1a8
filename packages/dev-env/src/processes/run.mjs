import { spawn } from 'node:child_process';
import { SetupError } from '../setup/fail.mjs';

/** Runs a command to its end. Resolves with { code, output }; `quiet` keeps the output back. Never throws on a non-zero code. */
export function run(command, args, { cwd, env, quiet = false, input } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      cwd,
      env: env ?? process.env,
      stdio: [input === undefined ? 'ignore' : 'pipe', 'pipe', 'pipe'],
    });
    let output = '';
    const take = (stream) => (chunk) => {
      output += chunk;
      if (!quiet) stream.write(chunk);
    };
    child.stdout.on('data', take(process.stdout));
    child.stderr.on('data', take(process.stderr));
    child.on('error', (error) => {
      reject(
        error.code === 'ENOENT' ? new SetupError(`The command ${command} is not on this machine.`) : error,
      );
    });
    child.on('close', (code, signal) => {
      resolve({ code: code ?? (signal === null ? 1 : 128), output });
    });
    if (input !== undefined) child.stdin.end(input);
  });
}

/** Runs a command that must succeed; on failure its output is shown and `remedy` says what to do. */
export async function mustRun(command, args, options = {}, remedy = '') {
  const { code, output } = await run(command, args, { quiet: true, ...options });
  if (code === 0) return output;
  const full = /no space left/iu.test(output)
    ? '\nThe disk is full: free some space and run the command again.'
    : '';
  throw new SetupError(
    `${[command, ...args].join(' ')} ended with ${code}.\n${output.trim().slice(-3000)}${full}${remedy === '' ? '' : `\n${remedy}`}`,
  );
}
