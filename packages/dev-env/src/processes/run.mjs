import { spawn } from 'node:child_process';
import { FULL_DISK, SetupError } from '../setup/fail.mjs';
import { stopGroup } from './process-group.mjs';
import { Interrupted, isShuttingDown, onShutdown } from './shutdown.mjs';

/**
 * Runs a command to its end. Resolves with { code, output }, whatever the code; rejects where it cannot be started.
 * @param options.quiet keeps the output back
 * @param options.input text for its standard input
 * @param options.stopSignal what stops it when this process ends early
 * @param options.lasting never cut off, and may begin while this process is ending (stopping PostgreSQL)
 */
export function run(command, args, options = {}) {
  const { cwd, env = process.env, quiet = false, input, stopSignal, lasting = false } = options;
  if (isShuttingDown() && !lasting) return Promise.reject(new Interrupted());
  return new Promise((resolve, reject) => {
    const stdio = [input === undefined ? 'ignore' : 'pipe', 'pipe', 'pipe'];
    const child = spawn(command, args, { cwd, env, stdio, detached: true });
    const forget = lasting ? () => {} : onShutdown(() => stopGroup(child, stopSignal));
    let output = '';
    const take = (stream) => (chunk) => {
      output += chunk;
      if (!quiet) stream.write(chunk);
    };
    child.stdout.setEncoding('utf8').on('data', take(process.stdout));
    child.stderr.setEncoding('utf8').on('data', take(process.stderr));
    child.on('error', (error) => {
      forget();
      reject(error.code === 'ENOENT' ? new SetupError(`${command} is not on this machine.`) : error);
    });
    child.on('close', (code, signal) => {
      forget();
      if (isShuttingDown() && !lasting) reject(new Interrupted());
      else resolve({ code: code ?? (signal === null ? 1 : 128), output });
    });
    // A program that ends without reading its input breaks the pipe; its exit code tells why.
    child.stdin?.on('error', () => {}).end(input);
  });
}

/** Runs a command that must succeed and resolves with its output; otherwise its output is shown and `remedy` says what to do. */
export async function mustRun(command, args, options = {}, remedy = '') {
  const { code, output } = await run(command, args, { quiet: true, ...options });
  if (code === 0) return output;
  const parts = [`${[command, ...args].join(' ')} ended with ${code}.`, output.trim().slice(-3000)];
  parts.push(/no space left|ENOSPC/iu.test(output) ? FULL_DISK : remedy);
  throw new SetupError(parts.filter((part) => part !== '').join('\n'));
}
