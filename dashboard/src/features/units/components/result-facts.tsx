import { Facts } from '@/components/ui/facts';
import { Figure } from '@/components/ui/figure';
import { TimeText } from '@/components/ui/time-text';
import type { ResultDetail } from '@/types/api';

const dispositions: Record<string, string> = {
  next: 'on to the next stage',
  retest: 'test again here',
  retestElsewhere: 'test again at another station',
  repair: 'to repair',
  hold: 'hold',
  stop: 'stop',
};

const versioned = (name: string | null, version: string | number | null) =>
  name === null && version === null ? null : [name, version].filter((part) => part !== null).join(' ');

/** Under which conditions the shown result was taken, and what the station was told. */
export function ResultFacts({ result }: { result: ResultDetail }) {
  return (
    <Facts
      facts={[
        ['Tested', <TimeText key="at" at={result.startedAt} show="full" />],
        ['Received', <TimeText key="at" at={result.receivedAt} show="full" />],
        ['Station', result.station],
        ['Fixture', result.fixture],
        ['Channel', result.channel],
        ['Badge', result.operator],
        ['Program', versioned(result.programName, result.programVersion)],
        ['Test plan', versioned(null, result.testPlanVersion)],
        ['Limit set', versioned(null, result.limitSetVersion)],
        [
          'Ambient',
          result.ambientCelsius === null ? null : <Figure key="t" value={result.ambientCelsius} unit="°C" />,
        ],
        [
          'Supply',
          result.supplyVolts === null ? null : <Figure key="v" value={result.supplyVolts} unit="V" />,
        ],
        ['Reference current', <Figure key="i" value={result.sweep.referenceAmps} unit="A" />],
        ['Abort reason', result.abortReason],
        ['Station’s own verdict', result.stationVerdict],
        ['Answer to the station', dispositions[result.disposition] ?? result.disposition],
        ['Routed on by', result.routedOn],
        ['Notes', result.notes],
      ]}
    />
  );
}
