import { Navigate, Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { Loading } from '../../components/ui/loading.tsx';
import { Problem } from '../../components/ui/problem.tsx';
import { useSession } from '../../lib/session/session-query.ts';
import { FrameFooter } from './frame-footer.tsx';
import { FrameHeader } from './frame-header.tsx';
import { ShortcutHost } from './shortcut-host.tsx';
import { SkipLink } from './skip-link.tsx';

/** Everything behind the sign-in: asks who is there, and sends nobody to the door with the way back remembered. */
export function AppFrame() {
  const session = useSession();
  const { pathname, search, hash } = useLocation();
  if (session.data === undefined)
    return (
      <div className="px-4">
        {session.error === null ? (
          <Loading what="your session" />
        ) : (
          <Problem
            error={session.error}
            title="Tipward cannot be reached."
            onRetry={() => void session.refetch()}
          />
        )}
      </div>
    );
  const { person } = session.data;
  if (person === null) {
    const here = `${pathname}${search}${hash}`;
    return <Navigate to={here === '/' ? '/sign-in' : `/sign-in?next=${encodeURIComponent(here)}`} replace />;
  }
  return (
    <div className="flex min-h-dvh flex-col">
      <SkipLink />
      <FrameHeader person={person} session={session.data} />
      <main id="main" tabIndex={-1} className="w-full flex-1 px-4 py-5 outline-none sm:px-6">
        <Outlet />
      </main>
      <FrameFooter demo={session.data.demo} />
      <ShortcutHost
        isAdministrator={person.isAdministrator}
        canCreateProgramme={session.data.canCreateProgramme}
      />
      <ScrollRestoration />
    </div>
  );
}
