import { createBrowserRouter, Navigate } from 'react-router-dom';
import type { RouteObject } from 'react-router-dom';
import { Loading } from '../components/ui/loading.tsx';
import { NotFound } from '../components/ui/not-found.tsx';
import { AppFrame } from './frame/app-frame.tsx';
import { EntryFrame } from './frame/entry-frame.tsx';
import { RouteFailure } from './route-failure.tsx';

/** Open to everybody: entering, and the mail caught on this machine. */
const entry: RouteObject[] = [
  { path: 'sign-in', lazy: () => import('../routes/sign-in.tsx') },
  { path: 'forgot-password', lazy: () => import('../routes/forgot-password.tsx') },
  { path: 'reset-password', lazy: () => import('../routes/reset-password.tsx') },
  { path: 'accept-invitation', lazy: () => import('../routes/accept-invitation.tsx') },
  { path: 'dev/mail', lazy: () => import('../routes/caught-mail.tsx') },
  { path: 'mail', element: <Navigate to="/dev/mail" replace /> },
];

const signedIn: RouteObject[] = [
  { index: true, lazy: () => import('../routes/programmes.tsx') },
  { path: 'programmes/new', lazy: () => import('../routes/new-programme.tsx') },
  { path: 'programmes/:programmeId', lazy: () => import('../routes/programme.tsx') },
  { path: 'programmes/:programmeId/specification', lazy: () => import('../routes/specification.tsx') },
  { path: 'programmes/:programmeId/designs/new', lazy: () => import('../routes/new-design.tsx') },
  { path: 'designs/:designId', lazy: () => import('../routes/design.tsx') },
  { path: 'drafts/:draftId', lazy: () => import('../routes/studio.tsx') },
  { path: 'compare', lazy: () => import('../routes/compare.tsx') },
  { path: 'versions/:versionId', lazy: () => import('../routes/version.tsx') },
  { path: 'reviews/:reviewId', lazy: () => import('../routes/review.tsx') },
  { path: 'releases/:releaseId', lazy: () => import('../routes/release.tsx') },
  { path: 'airfoils', lazy: () => import('../routes/airfoils.tsx') },
  { path: 'airfoils/new', lazy: () => import('../routes/new-airfoil.tsx') },
  { path: 'airfoils/:airfoilId', lazy: () => import('../routes/airfoil.tsx') },
  { path: 'people', lazy: () => import('../routes/people.tsx') },
  { path: 'audit', lazy: () => import('../routes/audit.tsx') },
  { path: 'account', lazy: () => import('../routes/account.tsx') },
  { path: '*', element: <NotFound /> },
];

/** A page that fails shows why inside the frame, so that the way out stays in reach. */
const guarded = (routes: RouteObject[]): RouteObject[] => [
  { errorElement: <RouteFailure />, children: routes },
];

export function createRouter() {
  return createBrowserRouter([
    {
      errorElement: <RouteFailure />,
      HydrateFallback: () => <Loading what="the page" />,
      children: [
        { element: <EntryFrame />, children: guarded(entry) },
        { element: <AppFrame />, children: guarded(signedIn) },
      ],
    },
  ]);
}
