import { createBrowserRouter, Navigate, type RouteObject } from 'react-router-dom';
import { PageSkeleton } from './components/PageSkeleton';
import { partsRoutes } from './pages/parts/partsRoutes';
import { teamRoutes } from './pages/team/teamRoutes';
import { entryRoutes } from './pages/sign-in/entryRoutes';
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
  ...partsRoutes,
  {
    path: 'imports',
    lazy: async () => ({ Component: (await import('./pages/imports/ImportsPage')).ImportsPage }),
  },
  {
    path: 'imports/:id',
    lazy: async () => ({ Component: (await import('./pages/imports/ImportPage')).ImportPage }),
  },
  ...teamRoutes,
  {
    path: 'prices',
    lazy: async () => ({ Component: (await import('./pages/prices/PricesPage')).PricesPage }),
  },
  {
    path: 'account',
    lazy: async () => ({ Component: (await import('./pages/account/AccountPage')).AccountPage }),
  },
  { path: '*', element: <NotFoundPage /> },
];

export const routes: RouteObject[] = [
  { errorElement: <ErrorPage />, HydrateFallback: PageSkeleton, children: entryRoutes },
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
