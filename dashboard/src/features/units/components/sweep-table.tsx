import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { Figure } from '@/components/ui/figure';
import type { Sweep, SweepPoint } from '@/types/api';

/** Readings are shown to the meter's resolution. */
const columnsFor = (resolutionAmps: number | null): DataColumn<SweepPoint>[] => [
  {
    key: 'index',
    head: 'Point',
    isRowHead: true,
    isTight: true,
    cell: ({ index }) => <span className="figures">{index + 1}</span>,
  },
  {
    key: 'volts',
    head: 'Load voltage',
    align: 'end',
    cell: ({ loadVolts }) => <Figure value={loadVolts} unit="V" />,
  },
  {
    key: 'amps',
    head: 'Output current',
    align: 'end',
    cell: ({ outputAmps, overload }) =>
      overload ? (
        'overload'
      ) : (
        <Figure
          value={outputAmps}
          unit="A"
          uncertainty={resolutionAmps === null ? null : resolutionAmps * 10}
        />
      ),
  },
  {
    key: 'ppm',
    head: 'Deviation',
    align: 'end',
    cell: ({ deviationPpm }) => (
      <Figure value={deviationPpm === null ? null : Math.round(deviationPpm * 10) / 10} unit="ppm" />
    ),
  },
  { key: 'direction', head: 'Direction', cell: ({ direction }) => direction },
  { key: 'fit', head: 'In the fit', cell: ({ inFit }) => (inFit ? 'yes' : 'no') },
];

export function SweepTable({ sweep }: { sweep: Sweep }) {
  return (
    <DataTable
      caption="Points of the sweep"
      columns={columnsFor(sweep.resolutionAmps)}
      rows={sweep.points}
      rowKey={({ index }) => String(index)}
    />
  );
}
