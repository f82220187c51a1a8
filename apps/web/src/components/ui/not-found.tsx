import { ButtonLink } from './button-link.tsx';

/** The address names nothing, or nothing this person may know of. */
export function NotFound({ what = 'the page' }: { what?: string }) {
  return (
    <div className="mx-auto max-w-prose py-8">
      <title>Not found · Tipward</title>
      <h1 className="m-0 text-2xl font-semibold">Could not find {what}</h1>
      <p className="mt-1 mb-4 text-ink-soft">
        The address may be mistyped, or it leads to something your role does not include. A link from an
        e-mail works once you are signed in as the person it was sent to.
      </p>
      <ButtonLink to="/">Go to the programmes</ButtonLink>
    </div>
  );
}
