import type { Comment } from '@tipward/contract';
import { describe, expect, it } from 'vitest';
import { threadsOf } from './threads.ts';

const comment = (id: string, over: Partial<Comment> = {}): Comment => ({
  id,
  author: { id: 'p', name: 'P' },
  text: id,
  stationRadiusM: null,
  replyTo: null,
  createdAt: '2026-01-01T00:00:00.000Z',
  resolvedAt: null,
  resolvedBy: null,
  abilities: { resolve: false },
  ...over,
});

describe('threadsOf', () => {
  it('puts replies under what they answer, and open threads before resolved ones', () => {
    const threads = threadsOf([
      comment('a', { resolvedAt: '2026-01-02T00:00:00.000Z' }),
      comment('b'),
      comment('a1', { replyTo: 'a' }),
      comment('b1', { replyTo: 'b' }),
      comment('b2', { replyTo: 'b' }),
    ]);
    expect(threads.map((thread) => [thread.comment.id, thread.replies.map((reply) => reply.id)])).toEqual([
      ['b', ['b1', 'b2']],
      ['a', ['a1']],
    ]);
  });
});
