import { describe, expect, it } from 'vitest';
import type { SolverContext, SolverReply, SolverRequest } from './protocol.ts';
import { SolverLink } from './solver-link.ts';
import type { SolverPort } from './solver-link.ts';

class FakePort implements SolverPort {
  readonly sent: SolverRequest[] = [];
  ended = false;
  private message: (event: { data: SolverReply }) => void = () => undefined;
  private error: (event: { message?: string }) => void = () => undefined;
  postMessage(request: SolverRequest) {
    this.sent.push(request);
  }
  addEventListener(type: 'message' | 'error', listener: (event: never) => void) {
    if (type === 'message') this.message = listener as typeof this.message;
    else this.error = listener as typeof this.error;
  }
  terminate() {
    this.ended = true;
  }
  reply(data: SolverReply) {
    this.message({ data });
  }
  crash(message: string) {
    this.error({ message });
  }
}

const context = {} as SolverContext;
const content = {} as never;

function linkOf() {
  const ports: FakePort[] = [];
  const link = new SolverLink(() => {
    const port = new FakePort();
    ports.push(port);
    return port;
  });
  return { ports, link };
}
const calls = (port: FakePort | undefined) => port?.sent.map((request) => request.call);

describe('SolverLink', () => {
  it('gives each answer to the call with its serial, in whatever order they come', async () => {
    const { ports, link } = linkOf();
    const first = link.call('evaluate', { key: 'k', content });
    const second = link.call('warmUp', { key: 'k', content });
    const [a, b] = ports[0]?.sent ?? [];
    ports[0]?.reply({ serial: b?.serial ?? -1, ok: true, output: 12 });
    ports[0]?.reply({ serial: a?.serial ?? -1, ok: false, message: 'the design has no airfoil' });
    await expect(second).resolves.toBe(12);
    await expect(first).rejects.toThrow('the design has no airfoil');
  });
  it('sends a context once', () => {
    const { ports, link } = linkOf();
    link.setContext('k', context);
    void link.call('warmUp', { key: 'k', content });
    link.setContext('k', context);
    void link.call('warmUp', { key: 'k', content });
    expect(calls(ports[0])).toEqual(['setContext', 'warmUp', 'warmUp']);
    link.setContext('k', { ...context });
    expect(calls(ports[0])).toEqual(['setContext', 'warmUp', 'warmUp', 'setContext']);
  });
  it('says so when the worker falls over, and starts a new one with the contexts', async () => {
    const { ports, link } = linkOf();
    link.setContext('k', context);
    const lost = link.call('warmUp', { key: 'k', content });
    ports[0]?.crash('out of memory');
    await expect(lost).rejects.toThrow('The solver stopped: out of memory');
    expect(ports[0]?.ended).toBe(true);
    void link.call('warmUp', { key: 'k', content });
    expect(calls(ports[1])).toEqual(['setContext', 'warmUp']);
  });
});
