import type { ReactNode } from 'react';

/** A narrow page with one thing to do. */
export function EntryPage({
  title,
  intro,
  children,
}: {
  title: string;
  intro?: ReactNode;
  children: ReactNode;
}) {
  return (
    <div className="mx-auto flex max-w-sm flex-col gap-5">
      <title>{`${title} · Tipward`}</title>
      <div>
        <h1 className="m-0 text-2xl font-semibold">{title}</h1>
        {intro !== undefined && <div className="mt-1 text-ink-soft">{intro}</div>}
      </div>
      {children}
    </div>
  );
}
