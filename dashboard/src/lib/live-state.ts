import { createContext, useContext } from 'react';
import type { LiveState } from './live-updates';

export interface LiveConnection {
  state: LiveState;
  /** When the server last gave a sign of life, in milliseconds, at the last change of state. */
  lastHeardAt: number;
}

export const LiveContext = createContext<LiveConnection>({ state: 'connecting', lastHeardAt: 0 });

export const useLiveConnection = (): LiveConnection => useContext(LiveContext);
