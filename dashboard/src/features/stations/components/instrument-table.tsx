import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { Figure } from '@/components/ui/figure';
import type { Instrument } from '@/types/api';
import { dayText } from '../station-words';
import { FactText } from './fact-text';

const unitOf = ({ kind }: Instrument) => (kind === 'ammeter' ? 'A' : 'V');

const columns: DataColumn<Instrument>[] = [
  {
    key: 'serial',
    head: 'Serial number',
    isRowHead: true,
    isTight: true,
    cell: ({ serialNumber }) => <span className="figures">{serialNumber}</span>,
  },
  {
    key: 'kind',
    head: 'Kind',
    isSelfExplaining: true,
    cell: ({ kind }) => (kind === 'ammeter' ? 'Ammeter' : 'Voltmeter'),
  },
  { key: 'model', head: 'Model', isSelfExplaining: true, cell: ({ model }) => model ?? '–' },
  {
    key: 'resolution',
    head: 'Resolution',
    align: 'end',
    cell: (instrument) => <Figure value={instrument.resolution} unit={unitOf(instrument)} />,
  },
  { key: 'accuracy', head: 'Accuracy', align: 'end', cell: (row) => <Accuracy instrument={row} /> },
  { key: 'calibration', head: 'Calibration', align: 'end', cell: (row) => <Calibration instrument={row} /> },
];

function Accuracy({
  instrument: { readingAccuracyPercent, rangeAccuracyPercent },
}: {
  instrument: Instrument;
}) {
  const parts = [
    readingAccuracyPercent === null ? null : `${readingAccuracyPercent} % of reading`,
    rangeAccuracyPercent === null ? null : `${rangeAccuracyPercent} % of range`,
  ].filter((part) => part !== null);
  return <>{parts.length > 0 ? parts.join(' + ') : 'not known'}</>;
}

function Calibration({ instrument: { calibrationDueOn, calibrationOverdue } }: { instrument: Instrument }) {
  if (calibrationDueOn === null) return <>no date known</>;
  const text = `${calibrationOverdue ? 'overdue since' : 'until'} ${dayText(calibrationDueOn)}`;
  return <FactText fact={{ text, isTrouble: calibrationOverdue }} />;
}

export function InstrumentTable({ station, instruments }: { station: string; instruments: Instrument[] }) {
  if (instruments.length === 0) {
    return (
      <EmptyState title="No instrument is on record here.">
        Results then stand on the resolution and accuracy that the station posts, and nobody is warned when a
        calibration runs out.
      </EmptyState>
    );
  }
  return (
    <DataTable
      caption={`Instruments of ${station}`}
      columns={columns}
      rows={instruments}
      rowKey={({ kind, serialNumber }) => `${kind} ${serialNumber}`}
    />
  );
}
