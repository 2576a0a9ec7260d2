import type { RouteObject } from 'react-router-dom';

/** Stations and what comes in from them. */
export const connectRoutes: RouteObject[] = [
  {
    path: 'stations',
    lazy: async () => ({ Component: (await import('./routes/stations')).StationsRoute }),
  },
  {
    path: 'stations/:station',
    lazy: async () => ({ Component: (await import('./routes/station')).StationRoute }),
  },
  {
    path: 'intake',
    lazy: async () => ({ Component: (await import('./routes/intake')).IntakeRoute }),
  },
  {
    path: 'intake/refused/:intakeId',
    lazy: async () => ({ Component: (await import('./routes/refused-post')).RefusedPostRoute }),
  },
  {
    path: 'connect',
    lazy: async () => ({ Component: (await import('./routes/connect')).ConnectRoute }),
  },
  {
    path: 'mailbox',
    lazy: async () => ({ Component: (await import('./routes/mailbox')).MailboxRoute }),
  },
];
