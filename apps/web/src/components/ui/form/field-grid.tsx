import type { ReactNode } from 'react';

/** Fields side by side, as many in a row as fit. */
export function FieldGrid({ children }: { children: ReactNode }) {
  return (
    <div className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,13rem),1fr))] items-start gap-x-5 gap-y-4">
      {children}
    </div>
  );
}
