import { Link } from 'react-router-dom';
import { Facts } from '@/components/ui/facts';
import { TimeText } from '@/components/ui/time-text';
import { paths } from '@/config/paths';
import type { Breach } from '@/types/api';
import { measureName } from '@/utils/measure-names';
import { eventsInWords, stateWords } from '../breach-state';

const measureWords = (measure: Breach['measure']): string =>
  measure === 'stoppedOnFail' ? 'the station stopped on a fail' : measureName(measure);

/** Since when, how often, and what people did about it. */
export function BreachFacts({ breach }: { breach: Breach }) {
  const { partNumber, stage } = breach;
  return (
    <Facts
      facts={[
        ['State', stateWords[breach.state]],
        ['Product', <span className="figures">{partNumber}</span>],
        ['Stage', <Link to={paths.units({ partNumber, stage, verdict: 'fail' })}>{stage}</Link>],
        ['Measure', measureWords(breach.measure)],
        ['Since', <TimeText at={breach.openedAt} show="both" />],
        ['Last', <TimeText at={breach.lastEventAt} show="both" />],
        ['Broken by', eventsInWords(breach.eventCount)],
        [
          'Acknowledged',
          breach.acknowledgedAt && <Deed by={breach.acknowledgedBy} at={breach.acknowledgedAt} />,
        ],
        ['Note', breach.note],
        ['Closed', breach.closedAt && <Deed by={breach.closedBy} at={breach.closedAt} />],
        ['Cause', breach.cause],
        ['Action', breach.action],
      ]}
    />
  );
}

function Deed({ by, at }: { by: string | null; at: string }) {
  return (
    <>
      {by ?? 'somebody'}, <TimeText at={at} show="both" />
    </>
  );
}
