import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { CrashPage } from './CrashPage';
import { PlainLayout } from './PlainLayout';
import { SessionProvider, Waiting } from './SessionGate';
import { Shell } from './Shell';

/** Each page is its own chunk and exports `Component`. */
const plainPages: RouteObject[] = [
  { path: '/sign-in', lazy: () => import('./routes/SignInPage') },
  { path: '/set-up', lazy: () => import('./routes/SetUpPage') },
  { path: '/invitation/:token', lazy: () => import('./routes/InvitationPage') },
];

const signedInPages: RouteObject[] = [
  { path: '/', lazy: () => import('./routes/HomePage') },
  { path: '/account', lazy: () => import('./routes/AccountPage') },
  { path: '/users', lazy: () => import('./routes/UsersPage') },
  { path: '/sites', lazy: () => import('./routes/SitesPage') },
  { path: '/slings', lazy: () => import('./routes/RegisterPage') },
  { path: '/slings/new', lazy: () => import('./routes/NewSlingPage') },
  { path: '/slings/:id', lazy: () => import('./routes/SlingPage') },
  { path: '/slings/:id/hold', lazy: () => import('./routes/HoldPage') },
  { path: '/slings/:id/inspect', lazy: () => import('./routes/InspectPage') },
  { path: '/slings/:id/do/:action', lazy: () => import('./routes/ActPage') },
  { path: '/slings/:id/ledger', lazy: () => import('./routes/LedgerPage') },
  { path: '/cage', lazy: () => import('./routes/CagePage') },
  { path: '/labels', lazy: () => import('./routes/LabelsPage') },
  { path: '/labels/:runId', lazy: () => import('./routes/LabelRunPage') },
  { path: '/printer-test', lazy: () => import('./routes/PrinterTestPage') },
  { path: '/scan', lazy: () => import('./routes/ScanPage') },
  { path: '*', lazy: () => import('./routes/NotFoundPage') },
];

export const router = createBrowserRouter([
  {
    ErrorBoundary: CrashPage,
    HydrateFallback: Waiting,
    children: [
      // No shell and no session: any phone's camera opens it. Paths match in any case, so /T/… as printed works.
      { path: '/t/:code', lazy: () => import('./routes/PublicTagPage') },
      {
        Component: SessionProvider,
        children: [
          { Component: PlainLayout, children: plainPages },
          { Component: Shell, children: signedInPages },
        ],
      },
    ],
  },
]);
