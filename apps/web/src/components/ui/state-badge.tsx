import type { VersionState } from '@tipward/contract';
import { classNames } from './class-names.ts';

const STATES: Record<VersionState, { word: string; look: string }> = {
  saved: { word: 'saved', look: 'border-rule-strong text-ink' },
  'in-review': { word: 'in review', look: 'border-look text-look' },
  approved: { word: 'approved', look: 'border-holds text-holds' },
  'changes-requested': { word: 'changes requested', look: 'border-fails text-fails' },
  released: { word: 'released', look: 'border-holds bg-holds text-paper' },
  superseded: { word: 'superseded', look: 'border-rule-strong text-ink-soft line-through' },
  withdrawn: { word: 'withdrawn', look: 'border-dashed border-rule-strong text-ink-soft' },
};

const BADGE = 'inline-flex h-5 items-center rounded-xs border px-1.5 text-xs whitespace-nowrap';

/** State of a version in its word; a release carries its letter. */
export function StateBadge({ state, letter }: { state: VersionState; letter?: string | null | undefined }) {
  const { word, look } = STATES[state];
  const lettered =
    letter !== null && letter !== undefined && (state === 'released' || state === 'superseded');
  return (
    <span className={classNames(BADGE, look)}>
      {word}
      {lettered ? ` ${letter}` : ''}
    </span>
  );
}

/** A private draft, marked so that nobody takes it for a version. */
export function DraftBadge() {
  return <span className={classNames(BADGE, 'border-dashed border-accent text-accent')}>draft</span>;
}
