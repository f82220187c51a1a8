import { ButtonLink } from './button-link.tsx';
import { EmptyState } from './empty-state.tsx';

/** The address names nothing, or nothing this person may know of. */
export function NotFound({ what = 'the page' }: { what?: string }) {
  return (
    <EmptyState
      title={`Could not find ${what}.`}
      action={<ButtonLink to="/">Go to the programmes</ButtonLink>}
    >
      The address may be mistyped, or it leads to something your role does not include. A link from an e-mail
      works once you are signed in as the person it was sent to.
    </EmptyState>
  );
}
