import { Link } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHeader } from '@/components/ui/page-header';
import { RunTable } from '@/components/ui/run-table';
import { Section } from '@/components/ui/section';
import { paths } from '@/config/paths';
import type { Station } from '@/types/api';
import { InstrumentTable } from './instrument-table';
import { KeySection } from './key-section';
import { StationFacts } from './station-facts';

export function StationPage({ station }: { station: Station }) {
  return (
    <>
      <PageHeader
        title={station.station}
        lead={<Link to={paths.stations()}>All stations</Link>}
        actions={<Link to={paths.units({ station: station.station })}>Units tested here</Link>}
      />
      <Section title="State">
        <StationFacts station={station} />
      </Section>
      <Section title="Newest result">
        {station.latest ? (
          <RunTable caption={`Newest result of ${station.station}`} runs={[station.latest]} />
        ) : (
          <EmptyState title="This station has not posted yet.">
            <Link to={paths.connect()}>The first post, step by step</Link>
          </EmptyState>
        )}
      </Section>
      <Section title="Instruments">
        <InstrumentTable station={station.station} instruments={station.instruments} />
      </Section>
      <KeySection station={station.station} />
    </>
  );
}
