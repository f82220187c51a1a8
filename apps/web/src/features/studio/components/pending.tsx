import type { ReactNode } from 'react';
import { classNames } from '../../../components/ui/class-names.ts';

/** Dims what does not answer the content in hand, so that it is never taken for current. */
export function Pending({ current, children }: { current: boolean; children: ReactNode }) {
  return (
    <div
      data-current={current}
      className={classNames('transition-opacity duration-100', !current && 'opacity-45')}
    >
      {children}
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
