import { useId } from 'react';
import type { ReactNode } from 'react';

/** A part of a page under a hairline, named by its heading. */
export function Section({
  title,
  note,
  actions,
  children,
}: {
  title: string;
  note?: ReactNode;
  actions?: ReactNode;
  children: ReactNode;
}) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="mb-8">
      <div className="mb-2 flex flex-wrap items-baseline gap-x-4 gap-y-1 border-b border-rule pb-1">
        <h2 id={id} className="m-0 text-base font-semibold">
          {title}
        </h2>
        {note !== undefined && <span className="text-[13px] text-ink-soft">{note}</span>}
        {actions !== undefined && <div className="no-print ml-auto flex flex-wrap gap-2">{actions}</div>}
      </div>
      {children}
    </section>
  );
}
