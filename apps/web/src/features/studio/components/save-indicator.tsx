import { classNames } from '../../../components/ui/class-names.ts';
import type { SaveState } from '../lib/autosaver.ts';

const WHERE = { true: 'kept on this machine', false: 'kept in this page only, do not close it' } as const;

function wordsOf(state: SaveState): { text: string; look: string } {
  switch (state.kind) {
    case 'saved':
      return { text: 'Saved', look: 'text-ink-soft' };
    case 'waiting':
      return { text: 'Edited', look: 'text-ink-soft' };
    case 'saving':
      return { text: 'Saving …', look: 'text-ink-soft' };
    case 'offline':
      return { text: `Offline – ${WHERE[`${state.keptHere}`]}`, look: 'text-look' };
    case 'refused':
      return { text: `Not saved: ${state.message} – ${WHERE[`${state.keptHere}`]}`, look: 'text-fails' };
    case 'conflict':
      return { text: 'Conflict – saved elsewhere meanwhile', look: 'text-fails' };
  }
}

/** Where the edits are: stored, on their way, or kept here. */
export function SaveIndicator({ state }: { state: SaveState }) {
  const { text, look } = wordsOf(state);
  return (
    <span role="status" data-save={state.kind} className={classNames('text-[13px]', look)}>
      {text}
    </span>
  );
}
