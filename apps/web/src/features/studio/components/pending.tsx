import type { ReactNode } from 'react';
import { classNames } from '../../../components/ui/class-names.ts';

/**
 * How a result that does not answer the content in hand is set back: lines and dots faint, figures in soft italics. Text
 * keeps its contrast, so that it can still be read.
 */
export const SET_BACK = 'italic text-ink-soft';
const SET_BACK_INSIDE =
  '[&_circle]:opacity-35 [&_path[data-series]]:opacity-35 [&_[data-figure]]:text-ink-soft [&_[data-figure]]:italic';

/** Sets back what does not answer the content in hand, so that it is never taken for current, and says why. */
export function Pending({
  current,
  reason,
  children,
}: {
  current: boolean;
  /** 'solving …', or why the draft cannot be solved; null where it is said nearby. */
  reason: string | null;
  children: ReactNode;
}) {
  return (
    <div data-current={current} className={classNames('relative', !current && SET_BACK_INSIDE)}>
      {children}
      {!current && reason !== null && (
        <span className="pointer-events-none absolute top-7 right-16 z-10 animate-appear border border-rule bg-paper px-1.5 text-xs text-ink-soft">
          {reason}
        </span>
      )}
    </div>
  );
}

/** 'solving …', 'solved in 12 ms', or why not. */
export function SolveState({
  current,
  error,
  faultCount,
  elapsedMs,
}: {
  current: boolean;
  error: string | null;
  faultCount: number;
  elapsedMs: number | null;
}) {
  const faults = `${faultCount} ${faultCount === 1 ? 'fault' : 'faults'}`;
  const text =
    faultCount > 0
      ? `not solved: ${faults} in the draft`
      : error !== null
        ? `not solved: ${error}`
        : current
          ? `solved in ${Math.max(1, Math.round(elapsedMs ?? 0))} ms`
          : 'solving …';
  const failing = faultCount > 0 || error !== null;
  return (
    <span className={classNames('figures text-xs', failing ? 'text-fails' : 'text-ink-soft')}>{text}</span>
  );
}
