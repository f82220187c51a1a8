import { Outlet } from 'react-router-dom';
import { FrameFooter } from './frame-footer.tsx';
import { SkipLink } from './skip-link.tsx';
import { Wordmark } from './wordmark.tsx';

/** Around the pages that need no session. */
export function EntryFrame() {
  return (
    <div className="flex min-h-dvh flex-col">
      <SkipLink />
      <header className="border-b border-rule px-4 py-2 sm:px-6">
        <Wordmark />
      </header>
      <main id="main" tabIndex={-1} className="w-full flex-1 px-4 py-8 outline-none sm:px-6 sm:py-14">
        <Outlet />
      </main>
      <FrameFooter demo={false} />
    </div>
  );
}
