import type { Draft, DraftContent, DraftStation, SpecificationIssue } from '@tipward/contract';
import { likeForLike } from '@tipward/design-model';
import { useEffect, useMemo, useReducer, useRef, useState } from 'react';
import { notify } from '../../../components/ui/notify.ts';
import { usePinnedAirfoils } from '../api/get-airfoil.ts';
import { headlineNumbers } from '../lib/headline-numbers.ts';
import { notesByRow } from '../lib/row-notes.ts';
import { startState, studioReducer } from '../lib/studio-reducer.ts';
import { useAutosave } from './use-autosave.ts';
import { useCheckedDraft } from './use-checked-draft.ts';
import { useCursor, useCursorStore } from './use-cursors.ts';
import { useDrawnReference, useReference, useSolverContext } from './use-reference.ts';
import type { Solvable } from './use-solver.ts';
import { useStudioSolver } from './use-solver.ts';

const NO_AIRFOILS: DraftContent['airfoils'] = [];

/** What the studio holds for one draft: content with undo, faults, results, reference, cursors and saving. */
export function useStudio(draft: Draft, issues: readonly SpecificationIssue[]) {
  const [history, dispatch] = useReducer(studioReducer, draft.content, startState);
  const { content } = history;
  const autosave = useAutosave(draft, content);
  const checked = useCheckedDraft(content);
  const cursors = useCursorStore();
  const picked = useCursor(cursors, (held) => held.tipSpeedRatio);
  const issue = issues.find((each) => each.issue === content.specificationIssue);
  const pinned = usePinnedAirfoils(checked.lastValid?.airfoils ?? NO_AIRFOILS);
  const context = useSolverContext(issue, pinned.airfoils);
  const reference = useReference(draft.parentVersionId, issues);
  const solvable = useMemo(
    (): Solvable | null =>
      checked.content === null || context === null ? null : { content: checked.content, context },
    [checked.content, context],
  );
  const designRatio = checked.lastValid?.designTipSpeedRatio ?? 7;
  const solver = useStudioSolver(solvable, reference.solvable, picked, picked ?? designRatio);
  const drawnReference = useDrawnReference(reference.version, solver.reference);

  const { current, output } = solver.live;
  const warnings = useMemo(() => (current ? (output?.warnings ?? []) : []), [current, output]);
  const notes = useMemo(() => notesByRow(checked.faults, warnings), [checked.faults, warnings]);
  const referenceStations = useMemo(
    () =>
      reference.version === null
        ? null
        : new Map<string, DraftStation>(
            reference.version.content.stations.map((station) => [String(station.radiusM), station]),
          ),
    [reference.version],
  );
  const numbers = headlineNumbers({
    live: solver.live,
    evaluation: solver.evaluation,
    reference: reference.version?.evaluation.keyNumbers ?? null,
  });
  const evaluated = solver.evaluation.output;
  const unlike = useMemo(
    () =>
      reference.version === null || checked.content === null
        ? []
        : likeForLike([
            { content: reference.version.content, evaluation: reference.version.evaluation },
            { content: checked.content, evaluation: evaluated },
          ]),
    [reference.version, checked.content, evaluated],
  );
  const retwist = useRetwist(content, solvable, solver.retwist, (stations) => {
    dispatch({
      type: 'change',
      label: 'Re-twist for maximum power',
      change: (before) => ({ ...before, stations }),
    });
  });
  return {
    history,
    dispatch,
    content,
    autosave,
    checked,
    cursors,
    designRatio,
    issue,
    pinned,
    reference,
    drawnReference,
    referenceStations,
    solver,
    warnings,
    notes,
    numbers,
    unlike,
    retwist,
    solvable,
  };
}

/** Re-twisting takes a moment; a result for a draft that was edited meanwhile is dropped, and said to be. */
function useRetwist(
  content: DraftContent,
  solvable: Solvable | null,
  run: (solvable: Solvable) => Promise<{ stations: DraftStation[] }>,
  apply: (stations: DraftStation[]) => void,
) {
  const [busy, setBusy] = useState(false);
  const latest = useRef(content);
  useEffect(() => {
    latest.current = content;
  }, [content]);
  const start = async () => {
    if (solvable === null) return;
    setBusy(true);
    try {
      const { stations } = await run(solvable);
      if (latest.current === content) apply(stations);
      else notify.failed('The draft changed while it was re-twisted; nothing was applied.');
    } catch (error) {
      notify.failed('The draft could not be re-twisted.', error);
    } finally {
      setBusy(false);
    }
  };
  return { busy, start };
}
