import { Fragment } from 'react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

export interface PageHeaderProps {
  title: string;
  /** Where this stands: programme › design. */
  trail?: readonly { label: string; to: string }[] | undefined;
  /** A StateBadge, say. */
  state?: ReactNode;
  /** Who changed it last, and when. */
  meta?: ReactNode;
  actions?: ReactNode;
}

/** What am I looking at, in which state, who changed it last, and what can I do. Sets the title of the window. */
export function PageHeader({ title, trail = [], state, meta, actions }: PageHeaderProps) {
  const place = [title, ...trail.map((step) => step.label).reverse(), 'Tipward'].join(' · ');
  return (
    <header className="mb-6 flex flex-wrap items-end gap-x-6 gap-y-3">
      <title>{place}</title>
      <div className="min-w-0 flex-1 basis-80">
        {trail.length > 0 && (
          <nav aria-label="Where this stands" className="flex flex-wrap gap-x-1.5 text-[13px] text-ink-soft">
            {trail.map((step) => (
              <Fragment key={step.to}>
                <Link to={step.to} className="link wrap-anywhere text-ink-soft">
                  {step.label}
                </Link>
                <span aria-hidden="true">›</span>
              </Fragment>
            ))}
          </nav>
        )}
        <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
          <h1 className="m-0 text-2xl font-semibold wrap-anywhere">{title}</h1>
          {state}
        </div>
        {meta !== undefined && <div className="mt-1 text-[13px] text-ink-soft">{meta}</div>}
      </div>
      {actions !== undefined && <div className="no-print flex flex-wrap gap-2">{actions}</div>}
    </header>
  );
}
