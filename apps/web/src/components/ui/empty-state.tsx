import type { ReactNode } from 'react';

/** Nothing here yet: say why, and what would put something here. */
export function EmptyState({
  title,
  children,
  action,
}: {
  title: string;
  children?: ReactNode;
  action?: ReactNode;
}) {
  return (
    <div className="border-y border-rule py-8 text-center">
      <p className="m-0 font-medium">{title}</p>
      {children !== undefined && <div className="mx-auto mt-1 max-w-prose text-ink-soft">{children}</div>}
      {action !== undefined && <div className="mt-4 flex justify-center gap-2">{action}</div>}
    </div>
  );
}
