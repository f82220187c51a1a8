import type { Verdict } from '@tipward/contract';
import { classNames } from './class-names.ts';

type Outcome = Verdict['verdict'];

const LOOKS: Record<Outcome, { look: string; path: string }> = {
  holds: { look: 'text-holds', path: 'M3 8.5l3.2 3.2L13 4.800' },
  fails: { look: 'text-fails', path: 'M4 4l8 8M12 4l-8 8' },
  unknown: {
    look: 'text-look',
    path: 'M5.500 6a2.500 2.500 0 1 1 3.600 2.300c-.8.4-1.100.9-1.100 1.700M8 12.600v.6',
  },
};

/** Whether a requirement holds: mark and word, never colour alone. */
export function VerdictMark({ verdict, word }: { verdict: Outcome; word?: string | undefined }) {
  const { look, path } = LOOKS[verdict];
  return (
    <span className={classNames('inline-flex items-center gap-1 whitespace-nowrap', look)}>
      <svg viewBox="0 0 16 16" width="14" height="14" aria-hidden="true">
        <path d={path} fill="none" stroke="currentColor" strokeWidth="1.8" strokeLinecap="round" />
      </svg>
      {word ?? verdict}
    </span>
  );
}
