import { Facts } from '@/components/ui/facts';
import { TimeText } from '@/components/ui/time-text';
import type { Station } from '@/types/api';
import { clockFact, stateFact } from '../station-words';
import { FactText } from './fact-text';
import { GoldenDue } from './golden-due';
import { PostsToday, RefusedToday } from './station-counts';

export function StationFacts({ station }: { station: Station }) {
  return (
    <Facts
      facts={[
        ['Line', station.line],
        ['State', <FactText fact={stateFact(station)} />],
        ['Last post', <TimeText at={station.lastPostAt} show="both" none="none yet" />],
        ['Last heartbeat', station.lastHeartbeatAt && <TimeText at={station.lastHeartbeatAt} show="both" />],
        ['Posts today', <PostsToday station={station} />],
        ['Refused today', <RefusedToday station={station} />],
        ['Its clock', <FactText fact={clockFact(station)} />],
        ['Golden check', <GoldenDue station={station} />],
      ]}
    />
  );
}
