import { formatQuantity } from '@ferrite-row/levels';
import { DataTable } from '../../../shared-ui/data-table';
import type { Column } from '../../../shared-ui/data-table-types';
import { fixed } from '../../../lib/text';
import { ChartOrTable } from '../results/chart-or-table';
import { PlainChart } from '../results/plain-chart';
import type { ReactanceRow, ResonanceSheet } from './resonance';

const MEGA = 1e6;

const ohmText = (ohms: number) => formatQuantity(ohms, 'ohm');

const COLUMNS: readonly Column<ReactanceRow>[] = [
  { key: 'hertz', header: 'Frequency', cell: ({ hertz }) => formatQuantity(hertz, 'Hz', 4) },
  { key: 'coil', header: 'Coil', align: 'right', phone: 'end', cell: ({ coil }) => `+ ${ohmText(coil)}` },
  {
    key: 'capacitor',
    header: 'Capacitor',
    align: 'right',
    cell: ({ capacitor }) => `− ${ohmText(capacitor)}`,
  },
];

/** Every so many points stand in the table and are marked in the chart. */
const EVERY = 5;

/** The two reactances, that meet at resonance. */
export function ResonancePicture({ sheet: { reactances } }: { sheet: ResonanceSheet }) {
  const middle = reactances[(reactances.length - 1) / 2];
  return (
    <ChartOrTable
      title="Reactances"
      chart={
        <PlainChart
          words={`Reactance of the coil rises and that of the capacitor falls; they meet at ${formatQuantity(middle.hertz, 'Hz', 4)}`}
          x={{ label: 'Frequency, MHz', format: (megahertz) => fixed(megahertz, 2) }}
          y={{ label: 'Size of the reactance, ohm', from: 0 }}
          at={reactances.map(({ hertz }) => hertz / MEGA)}
          lines={[
            { name: 'Coil', values: reactances.map(({ coil }) => coil) },
            { name: 'Capacitor', values: reactances.map(({ capacitor }) => capacitor) },
          ]}
          marks={[{ axis: 'x', at: middle.hertz / MEGA, words: 'resonance' }]}
          markEvery={EVERY}
        />
      }
      table={
        <DataTable
          label="Reactances"
          columns={COLUMNS}
          rows={reactances.filter((_, index) => index % EVERY === 0)}
          rowKey={({ hertz }) => String(hertz)}
        />
      }
    />
  );
}
