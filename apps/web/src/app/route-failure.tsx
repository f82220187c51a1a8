import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { Button } from '../components/ui/button.tsx';
import { ButtonLink } from '../components/ui/button-link.tsx';

/** A new release of the application takes the old files away: a page kept open since then cannot load its next part. */
const OUTDATED = /dynamically imported module|module script failed|Importing a module/iu;

function reasonOf(error: unknown): string {
  if (isRouteErrorResponse(error)) return `${String(error.status)} ${error.statusText}`;
  if (!(error instanceof Error)) return 'Nobody knows why.';
  return OUTDATED.test(error.message)
    ? 'A part of the application could not be loaded: the connection failed, or a newer release has taken its place.'
    : error.message;
}

/** What is shown when a screen could not be drawn: why, and two ways on. Nothing saved is touched by it. */
export function RouteFailure() {
  const error = useRouteError();
  return (
    <div role="alert" className="mx-auto max-w-prose px-4 py-12">
      <title>Failed · Tipward</title>
      <h1 className="m-0 text-2xl font-semibold">This screen failed</h1>
      <p className="my-2">What is saved is not touched by this. The reason, for whoever mends it:</p>
      <p className="figures my-3 border-l-2 border-fails bg-fails-wash px-3 py-2 text-[13px] wrap-anywhere">
        {reasonOf(error)}
      </p>
      <div className="flex gap-2">
        <Button
          kind="primary"
          onClick={() => {
            window.location.reload();
          }}
        >
          Load again
        </Button>
        <ButtonLink to="/" reloadDocument>
          Go to the programmes
        </ButtonLink>
      </div>
    </div>
  );
}
