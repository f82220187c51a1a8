import { Spinner } from './spinner.tsx';

/** Says what is on its way; shows itself after a moment, so that quick answers do not flicker. */
export function Loading({ what }: { what: string }) {
  return (
    <p role="status" className="m-0 flex animate-appear items-center gap-2 py-6 text-ink-soft">
      <Spinner /> Loading {what} …
    </p>
  );
}
