import type { RouteObject } from 'react-router-dom';

/** What the results say together. */
export const learnRoutes: RouteObject[] = [
  { path: 'yield', lazy: async () => ({ Component: (await import('./routes/yield')).YieldRoute }) },
];
