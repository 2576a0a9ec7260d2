import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { NotFound } from '@/components/errors/not-found';
import { RouteError } from '@/components/errors/route-error';
import { connectRoutes } from './connect-routes';
import { decideRoutes } from './decide-routes';
import { learnRoutes } from './learn-routes';
import { SignedInRoute } from './routes/signed-in';
import { settingsRoutes } from './settings-routes';

/** Nothing until the first page's chunk is there: it comes within a blink, and a flash of words would only distract. */
const beforeFirstPage = { HydrateFallback: () => null };

/** Every page is fetched when it is first opened. */
export const routes: RouteObject[] = [
  {
    path: '/sign-in',
    lazy: async () => ({ Component: (await import('./routes/sign-in')).SignInRoute }),
    ErrorBoundary: RouteError,
    ...beforeFirstPage,
  },
  {
    path: '/',
    Component: SignedInRoute,
    ...beforeFirstPage,
    ErrorBoundary: RouteError,
    children: [
      {
        ErrorBoundary: RouteError,
        children: [
          { index: true, lazy: async () => ({ Component: (await import('./routes/today')).TodayRoute }) },
          { path: 'units', lazy: async () => ({ Component: (await import('./routes/units')).UnitsRoute }) },
          {
            path: 'units/:partNumber/:serialNumber',
            lazy: async () => ({ Component: (await import('./routes/unit')).UnitRoute }),
          },
          ...learnRoutes,
          ...decideRoutes,
          ...connectRoutes,
          ...settingsRoutes,
          { path: '*', Component: NotFound },
        ],
      },
    ],
  },
];

export const createRouter = () => createBrowserRouter(routes);
