import type { DesignContent, Evaluation } from '@tipward/contract';
import type { LiveResult } from '@tipward/design-model';
import { useEffect, useMemo, useRef, useState } from 'react';
import { LatestOnly } from '../../../lib/solver/latest-only.ts';
import type { SolverContext } from '../../../lib/solver/protocol.ts';
import { SolverLink, spawnSolverWorker } from '../../../lib/solver/solver-link.ts';
import { useLatest } from '../../../lib/solver/use-latest.ts';
import type { Latest } from '../../../lib/solver/use-latest.ts';

/** A content with all it is solved under. */
export interface Solvable {
  readonly content: DesignContent;
  readonly context: SolverContext;
}
interface LiveRequest extends Solvable {
  readonly tipSpeedRatio: number | null;
}

/** After so many solves the worker's code is compiled. */
const WARM_AFTER = 8;
const EVALUATION_QUIET_MS = 150;

function liveChannel(link: SolverLink, key: string) {
  let solves = 0;
  const warmUp = async (content: DesignContent) => {
    // One solve at a time and only while nothing was asked: an edit waits for one of them at most.
    for (let expected = solves; solves === expected && solves < WARM_AFTER; expected += 1) {
      solves += 1;
      await link.call('warmUp', { key, content });
    }
  };
  return new LatestOnly<LiveRequest, LiveResult>(async ({ content, context, tipSpeedRatio }) => {
    link.setContext(key, context);
    solves += 1;
    const answer = await link.call('solveLive', { key, content, tipSpeedRatio });
    // A failure of the same solve is the answer's own failure, which is shown.
    warmUp(content).catch(() => undefined);
    return answer;
  });
}

function openChannels() {
  const live = new SolverLink(spawnSolverWorker);
  const background = new SolverLink(spawnSolverWorker);
  return {
    links: [live, background],
    draft: liveChannel(live, 'draft'),
    reference: liveChannel(background, 'reference'),
    evaluation: new LatestOnly<Solvable, Evaluation>(({ content, context }) => {
      background.setContext('draft', context);
      return background.call('evaluate', { key: 'draft', content });
    }, EVALUATION_QUIET_MS),
    retwist: ({ content, context }: Solvable) => {
      background.setContext('draft', context);
      return background.call('retwist', { key: 'draft', content });
    },
  };
}

function useLiveInput(solvable: Solvable | null, tipSpeedRatio: number | null): LiveRequest | null {
  return useMemo(
    () => (solvable === null ? null : { ...solvable, tipSpeedRatio }),
    [solvable, tipSpeedRatio],
  );
}

export interface StudioSolver {
  readonly live: Latest<LiveResult>;
  readonly evaluation: Latest<Evaluation>;
  readonly reference: Latest<LiveResult>;
  readonly retwist: (solvable: Solvable) => Promise<DesignContent>;
}

/**
 * The solver behind the studio: the draft in one worker, so that nothing stands before a key; its evaluation, the
 * reference and re-twisting in another.
 */
export function useStudioSolver(
  draft: Solvable | null,
  reference: Solvable | null,
  tipSpeedRatio: number | null,
  referenceTipSpeedRatio: number | null,
): StudioSolver {
  const [channels] = useState(openChannels);
  const closing = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  useEffect(() => {
    clearTimeout(closing.current);
    return () => {
      // A moment later, so that a component taken out and put back at once keeps its workers.
      closing.current = setTimeout(() => {
        for (const link of channels.links) link.close();
      }, 0);
    };
  }, [channels]);
  return {
    live: useLatest(channels.draft, useLiveInput(draft, tipSpeedRatio)),
    evaluation: useLatest(channels.evaluation, draft),
    reference: useLatest(channels.reference, useLiveInput(reference, referenceTipSpeedRatio)),
    retwist: channels.retwist,
  };
}
