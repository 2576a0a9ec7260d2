import { createContext, useContext } from 'react';
import type { Site } from '@/types/api';
import { $api } from './api-client';

export const siteOptions = () => $api.queryOptions('get', '/api/v1/site', {}, { staleTime: Infinity });

export const SiteContext = createContext<Site>({
  name: '',
  timeZone: 'UTC',
  demo: false,
  localMailbox: false,
  version: '',
  demoAccounts: [],
});

/** Name, time zone and kind of this installation. */
export const useSite = (): Site => useContext(SiteContext);
