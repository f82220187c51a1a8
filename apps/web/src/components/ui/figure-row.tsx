import type { ReactNode } from 'react';

/** Figures side by side, as many in a row as fit. */
export function FigureRow({ children }: { children: ReactNode }) {
  return (
    <dl className="m-0 grid grid-cols-[repeat(auto-fill,minmax(9.500rem,1fr))] gap-x-6 gap-y-3">
      {children}
    </dl>
  );
}
