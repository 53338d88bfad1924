import type { RouteObject } from 'react-router-dom';

export const teamRoutes: RouteObject[] = [
  {
    path: 'team',
    lazy: async () => ({ Component: (await import('./TeamPage')).TeamPage }),
  },
  {
    path: 'team/plan',
    lazy: async () => ({ Component: (await import('../plan/PlanPage')).PlanPage }),
  },
  {
    path: 'team/trail',
    lazy: async () => ({ Component: (await import('./TrailPage')).TrailPage }),
  },
];
