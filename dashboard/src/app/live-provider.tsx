import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState, type ReactNode } from 'react';
import { LiveContext, type LiveConnection } from '@/lib/live-state';
import { followLiveUpdates } from '@/lib/live-updates';

/** Keeps what is on screen in step with the server while somebody is signed in. */
export function LiveProvider({ children }: { children: ReactNode }) {
  const client = useQueryClient();
  const [connection, setConnection] = useState<LiveConnection>({ state: 'connecting', lastHeardAt: 0 });

  useEffect(
    () =>
      followLiveUpdates(client, (state, lastHeardAt) =>
        setConnection((before) => (before.state === state ? before : { state, lastHeardAt })),
      ),
    [client],
  );

  return <LiveContext.Provider value={connection}>{children}</LiveContext.Provider>;
}
