import type { Comment } from '@tipward/contract';

export interface Thread {
  readonly comment: Comment;
  readonly replies: readonly Comment[];
}

/** Comments with their replies: open ones first, each group in the order they were written. */
export function threadsOf(comments: readonly Comment[]): Thread[] {
  const threads = comments
    .filter((comment) => comment.replyTo === null)
    .map((comment) => ({ comment, replies: comments.filter((reply) => reply.replyTo === comment.id) }));
  const open = (thread: Thread) => (thread.comment.resolvedAt === null ? 0 : 1);
  return threads.sort((a, b) => open(a) - open(b));
}
