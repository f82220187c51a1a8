import { createServer } from 'node:net';
import { SetupError } from '../setup/fail.mjs';

function listen(port) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port, host: '127.0.0.1', exclusive: true }, () => resolve(server));
  });
}

const close = (server) => new Promise((resolve) => server.close(resolve));

/** Why a port on 127.0.0.1 cannot be listened on: a code of the system such as EADDRINUSE; null when it can. */
async function obstacle(port) {
  try {
    await close(await listen(port));
    return null;
  } catch (error) {
    return error.code;
  }
}

export const isFree = async (port) => (await obstacle(port)) === null;

/** Different free ports on 127.0.0.1, chosen by the system. */
export async function freePorts(count) {
  const servers = [];
  for (let i = 0; i < count; i += 1) servers.push(await listen(0));
  const ports = servers.map((server) => server.address().port);
  await Promise.all(servers.map(close));
  return ports;
}

export async function freePort() {
  const [port] = await freePorts(1);
  return port;
}

/** Reads a port from the environment's text. @throws SetupError naming the value and what is allowed. */
export function readPort(name, text, fallback) {
  if (text === undefined || text === '') return fallback;
  const port = Number(text);
  if (/^\d+$/u.test(text) && port >= 1 && port <= 65535) return port;
  throw new SetupError(`${name} is ${text}; allowed: a whole number from 1 to 65535.`);
}

/** @throws SetupError saying what to do where the port cannot be listened on. */
export async function requirePort(port, command) {
  const code = await obstacle(port);
  if (code === null) return;
  const other = `choose another: TIPWARD_PORT=${port === 4400 ? 4401 : 4400} ${command}`;
  if (code === 'EADDRINUSE')
    throw new SetupError(`Port ${port} is taken. Stop what listens there, or ${other}`);
  if (code === 'EACCES') throw new SetupError(`This user may not listen on port ${port}: ${other}`);
  throw new SetupError(`Port ${port} cannot be listened on (${code}): ${other}`);
}
