import type { Comment, Review } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { Moment } from '../../../components/ui/moment.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { useResolveComment } from '../api/change-review.ts';
import type { Thread } from '../lib/threads.ts';
import { threadsOf } from '../lib/threads.ts';
import { CommentForm } from './comment-form.tsx';

function Words({ comment }: { comment: Comment }) {
  return (
    <>
      <p className="m-0 text-[13px] text-ink-soft">
        <strong className="font-semibold text-ink">{comment.author.name}</strong>,{' '}
        <Moment at={comment.createdAt} />
      </p>
      <p className="m-0 whitespace-pre-wrap wrap-anywhere">{comment.text}</p>
    </>
  );
}

function Item({
  thread,
  review,
  onStation,
}: {
  thread: Thread;
  review: Review;
  onStation: (radiusM: number) => void;
}) {
  const [replying, setReplying] = useState(false);
  const resolve = useResolveComment();
  const { comment, replies } = thread;
  const { stationRadiusM } = comment;
  return (
    <li className="border-t border-rule py-3">
      {stationRadiusM !== null && (
        <button
          type="button"
          className="link figures min-h-6 cursor-pointer border-0 bg-transparent p-0 text-xs"
          title="Put the span cursor here"
          onClick={() => {
            onStation(stationRadiusM);
          }}
        >
          station r {formatQuantity('radiusM', stationRadiusM)} m
        </button>
      )}
      <Words comment={comment} />
      {replies.length > 0 && (
        <ul className="my-2 list-none border-l border-rule pl-4">
          {replies.map((reply) => (
            <li key={reply.id} className="py-1">
              <Words comment={reply} />
            </li>
          ))}
        </ul>
      )}
      {comment.resolvedAt !== null && comment.resolvedBy !== null && (
        <p className="m-0 text-[13px] text-holds">
          Resolved by {comment.resolvedBy.name}, <Moment at={comment.resolvedAt} />
        </p>
      )}
      <div className="no-print mt-1 flex gap-2">
        {review.abilities.comment && comment.resolvedAt === null && !replying && (
          <Button
            small
            kind="quiet"
            onClick={() => {
              setReplying(true);
            }}
          >
            Reply
          </Button>
        )}
        {comment.abilities.resolve && (
          <Button
            small
            kind="quiet"
            busy={resolve.isPending}
            onClick={() => {
              resolve.mutate(
                { params: { commentId: comment.id } },
                {
                  onError: (error) => {
                    notify.failed('The comment could not be resolved', error);
                  },
                },
              );
            }}
          >
            Resolve
          </Button>
        )}
      </div>
      {replying && (
        <CommentForm
          reviewId={review.id}
          replyTo={comment.id}
          onDone={() => {
            setReplying(false);
          }}
        />
      )}
    </li>
  );
}

/** Threads, open ones first. */
export function CommentList({ review, onStation }: { review: Review; onStation: (radiusM: number) => void }) {
  const threads = threadsOf(review.comments);
  if (threads.length === 0) return <p className="m-0 text-[13px] text-ink-soft">No comment yet.</p>;
  return (
    <ul className="m-0 list-none p-0">
      {threads.map((thread) => (
        <Item key={thread.comment.id} thread={thread} review={review} onStation={onStation} />
      ))}
    </ul>
  );
}
