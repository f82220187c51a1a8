import type { ReactNode } from 'react';

/** The row of buttons that ends a dialogue or a form: the thing to do last, at the right. */
export function DialogActions({ children }: { children: ReactNode }) {
  return <div className="mt-1 flex flex-wrap items-center justify-end gap-2">{children}</div>;
}
