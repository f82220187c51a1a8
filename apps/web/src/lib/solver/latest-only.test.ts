import { afterEach, describe, expect, it, vi } from 'vitest';
import { LatestOnly } from './latest-only.ts';

interface Job {
  input: string;
  resolve: (output: string) => void;
  reject: (error: Error) => void;
}

function channelOf(quietMs = 0) {
  const jobs: Job[] = [];
  const channel = new LatestOnly<string, string>(
    (input) =>
      new Promise((resolve, reject) => {
        jobs.push({ input, resolve, reject });
      }),
    quietMs,
  );
  return { jobs, channel };
}

const settle = () => new Promise((resolve) => setTimeout(resolve, 0));
const started = (jobs: Job[]) => jobs.map((job) => job.input);

afterEach(() => {
  vi.useRealTimers();
});

describe('LatestOnly', () => {
  it('runs one at a time and drops all waiting but the newest', async () => {
    const { jobs, channel } = channelOf();
    for (const input of ['a', 'b', 'c', 'd']) channel.request(input);
    expect(started(jobs)).toEqual(['a']);
    jobs[0]?.resolve('A');
    await settle();
    expect(started(jobs)).toEqual(['a', 'd']);
  });
  it('never gives an overtaken answer the newest input', async () => {
    const { jobs, channel } = channelOf();
    channel.request('a');
    channel.request('b');
    jobs[0]?.resolve('A');
    await settle();
    expect(channel.getState()).toMatchObject({ newest: 'b', shown: { input: 'a', output: 'A' } });
    jobs[1]?.resolve('B');
    await settle();
    expect(channel.getState()).toMatchObject({ newest: 'b', shown: { input: 'b', output: 'B' } });
  });
  it('names the input that failed, keeps the earlier answer and goes on', async () => {
    const { jobs, channel } = channelOf();
    channel.request('a');
    jobs[0]?.resolve('A');
    await settle();
    channel.request('b');
    channel.request('c');
    jobs[1]?.reject(new Error('no root'));
    await settle();
    expect(channel.getState().error).toEqual({ input: 'b', message: 'no root' });
    expect(channel.getState().shown?.input).toBe('a');
    expect(started(jobs)).toEqual(['a', 'b', 'c']);
    jobs[2]?.resolve('C');
    await settle();
    expect(channel.getState().error).toBeNull();
  });
  it('waits for quiet', () => {
    vi.useFakeTimers();
    const { jobs, channel } = channelOf(150);
    channel.request('a');
    vi.advanceTimersByTime(100);
    channel.request('b');
    vi.advanceTimersByTime(149);
    expect(started(jobs)).toEqual([]);
    vi.advanceTimersByTime(1);
    expect(started(jobs)).toEqual(['b']);
  });
});
