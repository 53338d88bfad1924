import { createBrowserRouter, Navigate, type RouteObject } from 'react-router-dom';
import { PageSkeleton } from './components/PageSkeleton';
import { ErrorPage } from './shell/ErrorPage';
import { START_PAGE } from './shell/navigation';
import { NotFoundPage } from './shell/NotFoundPage';
import { RequireSession } from './shell/RequireSession';

const pages: RouteObject[] = [
  { index: true, element: <Navigate to={START_PAGE} replace /> },
  {
    path: 'rank',
    lazy: async () => ({ Component: (await import('./pages/rank/RankPage')).RankPage }),
  },
  {
    path: 'rank',
    lazy: async () => ({ Component: (await import('./pages/rank/RankPage')).RankPage }),
  },
  {
    path: 'parts',
    lazy: async () => ({ Component: (await import('./pages/parts/PartsPage')).PartsPage }),
  },
  {
    path: 'parts/new',
    lazy: async () => ({ Component: (await import('./pages/parts/NewPartPage')).NewPartPage }),
  },
  {
    path: 'parts/:id',
    lazy: async () => ({ Component: (await import('./pages/parts/PartPage')).PartPage }),
  },
  {
    path: 'parts/:id/edit',
    lazy: async () => ({ Component: (await import('./pages/parts/EditPartPage')).EditPartPage }),
  },
  {
    path: 'account',
    lazy: async () => ({ Component: (await import('./pages/account/AccountPage')).AccountPage }),
  },
  { path: '*', element: <NotFoundPage /> },
];

export const routes: RouteObject[] = [
  {
    path: '/sign-in',
    lazy: async () => ({ Component: (await import('./pages/sign-in/SignInPage')).SignInPage }),
    errorElement: <ErrorPage />,
    HydrateFallback: PageSkeleton,
  },
  {
    path: '/',
    element: <RequireSession />,
    errorElement: <ErrorPage />,
    HydrateFallback: PageSkeleton,
    children: [{ errorElement: <ErrorPage />, children: pages }],
  },
];

export function createAppRouter() {
  return createBrowserRouter(routes);
}
