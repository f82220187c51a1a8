import { createServer } from 'node:net';
import { describe, expect, it } from 'vitest';
import { freePorts, isFree, readPort, requirePort } from './ports.mjs';

function occupy() {
  return new Promise((resolve) => {
    const server = createServer().listen(0, '127.0.0.1', () => resolve(server));
  });
}

describe('ports', () => {
  it('come different and free', async () => {
    const ports = await freePorts(20);
    expect(new Set(ports).size).toBe(20);
    expect(await isFree(ports[0])).toBe(true);
  });

  it('that are taken are named, with what to do', async () => {
    const server = await occupy();
    const { port } = server.address();
    expect(await isFree(port)).toBe(false);
    await expect(requirePort(port, 'npm start')).rejects.toThrow(
      `Port ${port} is taken. Stop what listens there, or choose another: TIPWARD_PORT=4400 npm start`,
    );
    await new Promise((resolve) => server.close(resolve));
    await expect(requirePort(port, 'npm start')).resolves.toBeUndefined();
  });

  it.each(['0', '65536', '-1', '4310.5', '0x10', 'web', '1e3', ' '])('refuse TIPWARD_PORT=%j', (text) => {
    expect(() => readPort('TIPWARD_PORT', text, 4310)).toThrow(
      `TIPWARD_PORT is ${text}; allowed: a whole number from 1 to 65535.`,
    );
  });

  it('fall back where nothing is said', () => {
    expect(readPort('TIPWARD_PORT', undefined, 4310)).toBe(4310);
    expect(readPort('TIPWARD_PORT', '', 4310)).toBe(4310);
    expect(readPort('TIPWARD_PORT', '8080', 4310)).toBe(8080);
  });
});
