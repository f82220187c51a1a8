import type { ReactNode } from 'react';
import { useSession } from '../../lib/session/session-query.ts';
import { ButtonLink } from './button-link.tsx';

/** Spares others a page full of refusals; the API holds to it in any case. */
export function AdministratorsOnly({ children }: { children: ReactNode }) {
  if (useSession().data?.person?.isAdministrator === true) return children;
  return (
    <div className="mx-auto max-w-prose py-8">
      <title>For administrators · Tipward</title>
      <h1 className="m-0 text-2xl font-semibold">For administrators</h1>
      <p className="mt-1 mb-4 text-ink-soft">Only an administrator of this installation sees this page.</p>
      <ButtonLink to="/">Go to the programmes</ButtonLink>
    </div>
  );
}
