import type { Person, Session } from '@tipward/contract';
import { Suspense, lazy } from 'react';
import { NavLink } from 'react-router-dom';
import { Button } from '../../components/ui/button.tsx';
import { classNames } from '../../components/ui/class-names.ts';
import { openPalette } from './open-palette.ts';
import { Wordmark } from './wordmark.tsx';

const AccountMenu = lazy(() => import('./account-menu.tsx'));

function HeaderLink({ to, label }: { to: string; label: string }) {
  return (
    <NavLink
      to={to}
      end={to === '/'}
      className={({ isActive }) =>
        classNames(
          'flex min-h-8 items-center border-b-2 text-ink no-underline',
          isActive ? 'border-accent font-medium' : 'border-transparent hover:border-rule-strong',
        )
      }
    >
      {label}
    </NavLink>
  );
}

export function FrameHeader({ person, session }: { person: Person; session: Session }) {
  return (
    <header className="no-print flex flex-wrap items-center gap-x-6 border-b border-rule px-4 py-1.5 sm:px-6">
      <Wordmark />
      <nav aria-label="Main" className="order-last flex w-full gap-5 overflow-x-auto sm:order-none sm:w-auto">
        <HeaderLink to="/" label="Programmes" />
        <HeaderLink to="/airfoils" label="Airfoils" />
        {person.isAdministrator && <HeaderLink to="/people" label="People" />}
        {person.isAdministrator && <HeaderLink to="/audit" label="Audit" />}
      </nav>
      <div className="ml-auto flex items-center gap-1">
        <Button kind="quiet" onClick={openPalette} aria-keyshortcuts="Control+K Meta+K">
          Go to
          <kbd className="figures rounded-xs border border-rule px-1 text-xs text-ink-soft max-sm:hidden">
            Ctrl K
          </kbd>
        </Button>
        {/* The menu's machinery comes after the page; until then its button stands there, without it. */}
        <Suspense fallback={<span className="inline-flex min-h-8 items-center px-3">{person.name}</span>}>
          <AccountMenu person={person} mailCatcher={session.mailCatcher} />
        </Suspense>
      </div>
    </header>
  );
}
