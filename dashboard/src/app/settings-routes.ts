import type { RouteObject } from 'react-router-dom';

/** The own account, and what administrators and auditors look into. */
export const settingsRoutes: RouteObject[] = [
  {
    path: 'settings',
    lazy: async () => ({ Component: (await import('./routes/settings')).SettingsRoute }),
  },
  {
    path: 'settings/accounts',
    lazy: async () => ({ Component: (await import('./routes/accounts')).AccountsRoute }),
  },
  {
    path: 'settings/rights',
    lazy: async () => ({ Component: (await import('./routes/rights')).RightsRoute }),
  },
  {
    path: 'settings/audit',
    lazy: async () => ({ Component: (await import('./routes/audit')).AuditRoute }),
  },
  {
    path: 'settings/proof',
    lazy: async () => ({ Component: (await import('./routes/proof')).ProofRoute }),
  },
];
