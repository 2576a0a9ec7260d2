import { createContext, useContext } from 'react';
import type { LiveState } from './live-updates';

export interface LiveConnection {
  state: LiveState;
  /** Since when, in milliseconds. */
  since: number;
}

export const LiveContext = createContext<LiveConnection>({ state: 'connecting', since: 0 });

export const useLiveConnection = (): LiveConnection => useContext(LiveContext);
