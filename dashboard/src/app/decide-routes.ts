import type { RouteObject } from 'react-router-dom';

/** What broke a limit, and who does what about it. */
export const decideRoutes: RouteObject[] = [
  {
    path: 'breaches',
    lazy: async () => ({ Component: (await import('./routes/breaches')).BreachesRoute }),
  },
  {
    path: 'breaches/:breachId',
    lazy: async () => ({ Component: (await import('./routes/breach')).BreachRoute }),
  },
];
