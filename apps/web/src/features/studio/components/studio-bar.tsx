import type { Design, Draft } from '@tipward/contract';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/ui/button.tsx';
import { Menu, MenuItem, MenuLabel, MenuRule } from '../../../components/ui/menu.tsx';
import { DraftBadge } from '../../../components/ui/state-badge.tsx';
import { formatMoment } from '../../../lib/time/format-time.ts';
import type { Reference } from '../hooks/use-reference.ts';
import { NO_REFERENCE } from '../hooks/use-reference.ts';
import type { KeptEdit } from '../lib/kept-edits.ts';
import type { StudioState } from '../lib/studio-reducer.ts';

export interface StudioBarProps {
  readonly draft: Draft;
  readonly design: Design | undefined;
  readonly history: StudioState;
  readonly reference: Reference;
  readonly saveState: ReactNode;
  readonly solveState: ReactNode;
  readonly setAside: readonly KeptEdit[];
  readonly retwisting: boolean;
  readonly canRetwist: boolean;
  readonly onUndo: () => void;
  readonly onRedo: () => void;
  readonly onRetwist: () => void;
  readonly onSaveVersion: () => void;
  readonly onDiscard: () => void;
  readonly onTakeSetAside: (edit: KeptEdit) => void;
}

function ReferenceChoice({ design, reference }: { design: Design | undefined; reference: Reference }) {
  const versions = design?.versions ?? [];
  const known = versions.some((version) => version.id === reference.chosen);
  return (
    <label className="flex items-center gap-2 text-[13px] text-ink-soft">
      against
      <select
        aria-label="Compared with"
        className="control min-h-7 w-auto max-w-40 py-0.5 text-[13px]"
        value={reference.chosen}
        onChange={(event) => {
          reference.choose(event.target.value);
        }}
      >
        {!known && reference.chosen !== NO_REFERENCE && (
          <option value={reference.chosen}>{reference.version?.label ?? 'another version'}</option>
        )}
        {versions.map((version) => (
          <option key={version.id} value={version.id}>
            {version.label}
          </option>
        ))}
        <option value={NO_REFERENCE}>nothing</option>
      </select>
    </label>
  );
}

/** What is under edit, whether it is stored, and what can be done with it. */
export function StudioBar(props: StudioBarProps) {
  const { draft, design, history, reference, saveState, solveState, setAside } = props;
  const undone = history.past.at(-1)?.label;
  const redone = history.future.at(-1)?.label;
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1 border-b border-rule py-1.5">
      <title>{`${draft.designName} draft · ${draft.programmeName} · Tipward`}</title>
      <h1 className="m-0 flex min-w-0 items-center gap-2 text-base font-semibold">
        <Link
          to={`/programmes/${draft.programmeId}`}
          className="link font-normal text-ink-soft max-sm:hidden"
        >
          {draft.programmeName}
        </Link>
        <span aria-hidden="true" className="font-normal text-ink-soft max-sm:hidden">
          ›
        </span>
        <Link to={`/designs/${draft.designId}`} className="link min-w-0 truncate">
          {draft.designName}
        </Link>
        <DraftBadge />
      </h1>
      {draft.parentLabel !== null && (
        <span className="text-[13px] text-ink-soft">from {draft.parentLabel}, private to you</span>
      )}
      {saveState}
      {solveState}
      <div className="no-print ml-auto flex flex-wrap items-center gap-1">
        <ReferenceChoice design={design} reference={reference} />
        <Button
          small
          kind="quiet"
          disabled={undone === undefined}
          onClick={props.onUndo}
          title={undone === undefined ? 'Nothing to undo' : `Undo: ${undone} (Ctrl + Z)`}
        >
          Undo
        </Button>
        <Button
          small
          kind="quiet"
          disabled={redone === undefined}
          onClick={props.onRedo}
          title={redone === undefined ? 'Nothing to redo' : `Redo: ${redone} (Ctrl + Y)`}
        >
          Redo
        </Button>
        <Button
          small
          disabled={!props.canRetwist}
          busy={props.retwisting}
          onClick={props.onRetwist}
          title="The twist that gives each annulus the most power at the design tip-speed ratio and pitch"
        >
          Re-twist for maximum power
        </Button>
        <Menu
          trigger={
            <Button small kind="quiet">
              More
            </Button>
          }
        >
          {setAside.length > 0 && <MenuLabel>Set aside on this machine</MenuLabel>}
          {setAside.map((edit) => (
            <MenuItem
              key={edit.at}
              onSelect={() => {
                props.onTakeSetAside(edit);
              }}
            >
              Take up the edits of {formatMoment(edit.at)}
            </MenuItem>
          ))}
          {setAside.length > 0 && <MenuRule />}
          <MenuItem onSelect={props.onDiscard}>Discard this draft …</MenuItem>
        </Menu>
        <Button small kind="primary" onClick={props.onSaveVersion}>
          Save version
        </Button>
      </div>
    </div>
  );
}
