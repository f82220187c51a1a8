import type { DraftContent, Specification, SpecificationIssue, Draft } from '@tipward/contract';
import { useCallback, useMemo, useState } from 'react';
import type { PlotLimit } from '../../../components/plots/plot-series.ts';
import { Problem } from '../../../components/ui/problem.tsx';
import { useDesign } from '../api/get-design.ts';
import { useAirfoilLibrary } from '../api/list-airfoils.ts';
import { useCursor } from '../hooks/use-cursors.ts';
import { useStudio } from '../hooks/use-studio.ts';
import { useStudioKeys } from '../hooks/use-studio-keys.ts';
import { rotorFaults } from '../lib/row-notes.ts';
import { nearestRow } from '../lib/studio-series.ts';
import { DiscardDialog } from './discard-dialog.tsx';
import { EditNotices } from './edit-notices.tsx';
import { SolveState } from './pending.tsx';
import { RotorColumn } from './rotor-column.tsx';
import { SaveIndicator } from './save-indicator.tsx';
import { SaveVersionDialog } from './save-version-dialog.tsx';
import { SettingsPanel } from './settings-panel.tsx';
import { SpanColumn } from './span-column.tsx';
import { StationGrid } from './station-grid.tsx';
import { StudioBar } from './studio-bar.tsx';

type Model = ReturnType<typeof useStudio>;
type LeftTab = 'stations' | 'settings';
const TABS: readonly { id: LeftTab; label: string }[] = [
  { id: 'stations', label: 'Stations' },
  { id: 'settings', label: 'Design settings' },
];

function useReplacements({ dispatch, autosave, content }: Model) {
  const replace = (label: string, next: DraftContent) => {
    dispatch({ type: 'change', label, change: () => next });
  };
  return {
    take: (next: DraftContent) => {
      replace('Take up kept edits', next);
    },
    mine: (stored: DraftContent) => {
      // Both become steps, so that undo reaches the stored one.
      replace('The draft stored elsewhere', stored);
      replace('Keep mine', content);
      autosave.saver.resolve('mine');
    },
    theirs: (stored: DraftContent) => {
      autosave.markStored(stored);
      autosave.saver.resolve('theirs');
      replace('Take the stored draft', stored);
    },
  };
}

function LeftColumn({ model, issues }: { model: Model; issues: readonly SpecificationIssue[] }) {
  const [tab, setTab] = useState<LeftTab>('stations');
  const library = useAirfoilLibrary();
  const { content, dispatch, checked, cursors } = model;
  const stations = checked.lastValid?.stations;
  const cursorRow = useCursor(cursors, (held) => nearestRow(stations ?? [], held.radiusM));
  const faults = useMemo(() => rotorFaults(checked.faults), [checked.faults]);
  const onRow = useCallback(
    (row: number) => {
      const radiusM = content.stations[row]?.radiusM;
      if (typeof radiusM === 'number' && Number.isFinite(radiusM)) cursors.setRadius(radiusM);
    },
    [content.stations, cursors],
  );
  return (
    <div className="flex max-h-[80dvh] min-h-0 min-w-0 flex-col xl:max-h-none">
      <div role="group" aria-label="What is edited" className="flex gap-4">
        {TABS.map(({ id, label }) => (
          <button
            key={id}
            type="button"
            aria-pressed={tab === id}
            onClick={() => {
              setTab(id);
            }}
            className="min-h-7 cursor-pointer border-0 border-b-2 border-transparent bg-transparent px-0 text-[13px] text-ink-soft aria-pressed:border-accent aria-pressed:font-medium aria-pressed:text-ink"
          >
            {label}
            {id === 'settings' && faults.length > 0 && <span className="text-fails"> ▲</span>}
          </button>
        ))}
      </div>
      {tab === 'stations' ? (
        <StationGrid
          content={content}
          dispatch={dispatch}
          notes={model.notes}
          reference={model.referenceStations}
          cursorRow={cursorRow}
          onRow={onRow}
        />
      ) : (
        <SettingsPanel
          content={content}
          dispatch={dispatch}
          faults={faults}
          issues={issues}
          library={library.data?.items ?? []}
        />
      )}
    </div>
  );
}

function chordLimits(issue: SpecificationIssue): readonly PlotLimit[] {
  const found = issue.requirements.find((requirement) => requirement.kind === 'max-chord');
  return found === undefined ? [] : [{ value: found.limit, label: 'largest chord' }];
}

function Results({ model, issue }: { model: Model; issue: SpecificationIssue }) {
  const { checked, solver, cursors, pinned } = model;
  const specification: Specification = issue.specification;
  const limits = useMemo(() => ({ chord: chordLimits(issue) }), [issue]);
  const stations = checked.lastValid?.stations;
  const pendingReason =
    checked.faults.length > 0
      ? solver.live.output === null
        ? 'not solved: the draft has faults'
        : 'earlier result: the draft has faults'
      : (solver.live.error ?? 'solving …');
  const radii = useMemo(() => (stations ?? []).map((station) => station.radiusM), [stations]);
  return (
    <>
      <SpanColumn
        specification={specification}
        content={checked.lastValid}
        airfoils={pinned.airfoils}
        live={solver.live.output}
        current={solver.live.current}
        reference={model.drawnReference}
        referenceSurface={model.reference.surface}
        limits={limits}
        cursors={cursors}
        pendingReason={pendingReason}
      />
      <RotorColumn
        live={solver.live}
        evaluation={solver.evaluation}
        reference={model.drawnReference}
        numbers={model.numbers}
        unlike={model.unlike}
        warnings={model.warnings}
        designTipSpeedRatio={model.designRatio}
        stationRadiiM={radii}
        cursors={cursors}
        pendingReason={pendingReason}
      />
    </>
  );
}

/** The studio for one draft. Remount it (by key) for another. */
export function Studio({ draft, issues }: { draft: Draft; issues: readonly SpecificationIssue[] }) {
  const model = useStudio(draft, issues);
  const { history, dispatch, content, autosave, checked, solver, reference, retwist } = model;
  const [dialog, setDialog] = useState<'version' | 'discard' | null>(null);
  const design = useDesign(draft.designId);
  const replacements = useReplacements(model);
  const keys = useMemo(
    () => ({
      undo: () => {
        dispatch({ type: 'undo' });
      },
      redo: () => {
        dispatch({ type: 'redo' });
      },
      save: () => void autosave.saver.flush(),
    }),
    [dispatch, autosave.saver],
  );
  useStudioKeys(keys);
  const close = () => {
    setDialog(null);
  };
  return (
    <div className="-mx-4 -my-5 flex flex-col gap-1 px-4 sm:-mx-6 sm:px-6 xl:h-[calc(100dvh-45px)]">
      <StudioBar
        draft={draft}
        design={design.data}
        history={history}
        reference={reference}
        saveState={<SaveIndicator state={autosave.state} />}
        solveState={
          <SolveState
            current={solver.live.current}
            error={solver.live.error}
            faultCount={checked.faults.length}
            elapsedMs={solver.live.elapsedMs}
          />
        }
        setAside={autosave.kept.allSetAside()}
        retwisting={retwist.busy}
        canRetwist={model.solvable !== null}
        onUndo={keys.undo}
        onRedo={keys.redo}
        onRetwist={() => void retwist.start()}
        onSaveVersion={() => {
          setDialog('version');
        }}
        onDiscard={() => {
          setDialog('discard');
        }}
        onTakeSetAside={(edit) => {
          replacements.take(edit.content);
        }}
      />
      <EditNotices
        autosave={autosave}
        content={content}
        onTake={replacements.take}
        onMine={replacements.mine}
        onTheirs={replacements.theirs}
      />
      {reference.error !== null && (
        <Problem error={reference.error} title="The reference could not be read." />
      )}
      {model.pinned.error !== null && (
        <Problem error={model.pinned.error} title="An airfoil could not be read." />
      )}
      <div className="grid min-h-0 flex-1 gap-x-4 gap-y-6 pb-2 xl:grid-cols-[minmax(22rem,25rem)_minmax(0,1fr)_minmax(23rem,27rem)]">
        <LeftColumn model={model} issues={issues} />
        {model.issue === undefined ? (
          <p role="alert" className="m-0 text-fails">
            Specification issue {content.specificationIssue} does not exist; choose one under Design settings.
          </p>
        ) : (
          <Results model={model} issue={model.issue} />
        )}
      </div>
      {dialog === 'version' && (
        <SaveVersionDialog
          draftId={draft.id}
          autosave={autosave}
          faults={checked.faults}
          verdicts={solver.evaluation.current ? (solver.evaluation.output?.verdicts ?? null) : null}
          onClose={close}
        />
      )}
      {dialog === 'discard' && <DiscardDialog draft={draft} autosave={autosave} onClose={close} />}
    </div>
  );
}
