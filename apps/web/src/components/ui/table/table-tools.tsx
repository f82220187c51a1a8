import type { ReactNode } from 'react';
import { Button } from '../button.tsx';

export function TableTools({
  label,
  filter,
  onFilter,
  counts,
  onSave,
  children,
}: {
  label: string;
  filter: string;
  onFilter: (filter: string) => void;
  counts: { shown: number; all: number };
  onSave: () => void;
  children?: ReactNode;
}) {
  return (
    <div className="no-print mb-2 flex flex-wrap items-center gap-3">
      <input
        type="search"
        aria-label={`Filter ${label}`}
        placeholder="Filter"
        value={filter}
        onChange={(event) => {
          onFilter(event.target.value);
        }}
        className="control max-w-56"
      />
      {children}
      <span role="status" className="ml-auto text-[13px] text-ink-soft">
        {counts.shown === counts.all
          ? String(counts.all)
          : `${String(counts.shown)} of ${String(counts.all)}`}
      </span>
      <Button small kind="quiet" aria-label={`Save ${label} as CSV`} onClick={onSave}>
        CSV
      </Button>
    </div>
  );
}
