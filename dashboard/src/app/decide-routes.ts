import type { RouteObject } from 'react-router-dom';

/** The limits, what broke them, and who does what about it. */
export const decideRoutes: RouteObject[] = [
  { path: 'limits', lazy: async () => ({ Component: (await import('./routes/limits')).LimitsRoute }) },
  {
    path: 'breaches',
    lazy: async () => ({ Component: (await import('./routes/breaches')).BreachesRoute }),
  },
  {
    path: 'breaches/:breachId',
    lazy: async () => ({ Component: (await import('./routes/breach')).BreachRoute }),
  },
];
