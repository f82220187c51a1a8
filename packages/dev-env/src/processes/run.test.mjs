import { describe, expect, it } from 'vitest';
import { mustRun, run } from './run.mjs';

const script = (text) => [process.execPath, ['-e', text]];

describe('a command', () => {
  it('gives back its code and all its output', async () => {
    const [node, args] = script('console.log("out"); console.error("err"); process.exit(7)');
    const { code, output } = await run(node, args, { quiet: true });
    expect(code).toBe(7);
    expect(output.split('\n').sort()).toEqual(['', 'err', 'out']);
  });

  it('reads its input', async () => {
    expect(await mustRun('cat', [], { input: 'η = 16/27' })).toBe('η = 16/27');
  });

  it('that is missing is named', async () => {
    await expect(run('no-such-command', [])).rejects.toThrow('no-such-command is not on this machine.');
  });

  it('that must succeed shows its output and what to do', async () => {
    const [node, args] = script('console.error("no such host"); process.exit(1)');
    await expect(mustRun(node, args, {}, 'Is the network up?')).rejects.toThrow(
      /ended with 1\.\nno such host\nIs the network up\?$/u,
    );
  });

  it('that met a full disk says so', async () => {
    const [node, args] = script('console.error("write: No space left on device"); process.exit(1)');
    await expect(mustRun(node, args, {}, 'Is the network up?')).rejects.toThrow(/The disk is full: free/u);
  });
});
