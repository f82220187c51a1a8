import type { ReactNode } from 'react';

export interface FigureProps {
  label: string;
  unit?: string | undefined;
  /** Already formatted (formatQuantity); '–' where there is none. */
  value: string;
  /** The value is words, not a number. */
  words?: boolean | undefined;
  /** Why there is no value, or why it is to be read with care; marks the figure. */
  reason?: string | undefined;
  /** Beneath the value: a difference, the λ it was found at. */
  note?: ReactNode;
}

/** One number a person compares: label and unit above, value in tabular figures. Put several into a <dl>. */
export function Figure({ label, unit, value, words = false, reason, note }: FigureProps) {
  return (
    <div className="min-w-0">
      <dt className="text-[13px] text-ink-soft">
        {label}
        {unit !== undefined && unit !== '' && `, ${unit}`}
      </dt>
      <dd className="m-0">
        <span className={words ? '' : 'figures text-base'} title={reason}>
          {value}
        </span>
        {reason !== undefined && value !== '–' && (
          <span className="text-look" aria-hidden="true">
            {' '}
            ▲
          </span>
        )}
        {reason !== undefined && <span className="sr-only"> ({reason})</span>}
        {note !== undefined && <span className="figures block text-[13px] text-ink-soft">{note}</span>}
      </dd>
    </div>
  );
}
