import { spawn } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';

const COMMAND = fileURLToPath(new URL('fixtures/command.mjs', import.meta.url));

/** Starts the fixture and resolves once `pids` sleeping processes have reported. */
function startCommand(pids, ...args) {
  const child = spawn(process.execPath, [COMMAND, ...args], { stdio: ['ignore', 'pipe', 'pipe'] });
  const seen = { output: '' };
  const ended = new Promise((resolve) => child.on('close', (code) => resolve(code)));
  const numbers = () => [...seen.output.matchAll(/pid (\d+)/gu)].map(([, pid]) => Number(pid));
  const ready = new Promise((resolve) => {
    const take = (chunk) => {
      seen.output += chunk;
      if (numbers().length >= pids) resolve();
    };
    child.stdout.on('data', take);
    child.stderr.on('data', take);
  });
  return { child, ready, ended, numbers, output: () => seen.output };
}

const lives = (pid) =>
  existsSync(`/proc/${pid}/status`) && !/^State:\s+Z/mu.test(readFileSync(`/proc/${pid}/status`, 'utf8'));

describe('a command that is stopped', () => {
  it.each(['SIGINT', 'SIGTERM', 'SIGHUP'])('by %s leaves no process behind', async (signal) => {
    const command = startCommand(4);
    await command.ready;
    expect(command.numbers().every(lives)).toBe(true);
    command.child.kill(signal);
    command.child.kill(signal);
    expect(await command.ended).toBe(0);
    expect(command.numbers().filter(lives)).toEqual([]);
    expect(command.output()).toMatch(/undone first, so printed last\n$/u);
  });

  it('by the end of one of its services fails, says which, and leaves no process behind', async () => {
    const command = startCommand(2, 'failing-service');
    expect(await command.ended).toBe(1);
    expect(command.output()).toContain('The brittle one ended with 3');
    expect(command.numbers().filter(lives)).toEqual([]);
  });
});
