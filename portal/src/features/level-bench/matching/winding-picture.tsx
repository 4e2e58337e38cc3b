import { DataTable } from '../../../shared-ui/data-table';
import { ChartOrTable } from '../results/chart-or-table';
import { PlainChart } from '../results/plain-chart';
import { henryText, offText, type WindingSheet } from './windings';

const NANO = 1e9;

/** Inductance of the turns either side, and what is wanted. */
export function WindingPicture({ sheet }: { sheet: WindingSheet }) {
  const { rows, wantedHenries: wanted } = sheet;
  return (
    <ChartOrTable
      title="A turn more or less"
      chart={
        <PlainChart
          words={`Inductance of ${rows.map(({ turns, henries }) => `${turns} turns ${henryText(henries)}`).join(', ')}`}
          x={{ label: 'Turns', leastStep: 1 }}
          y={{ label: 'Inductance, nH', from: 0 }}
          at={rows.map(({ turns }) => turns)}
          lines={[{ name: 'Inductance', values: rows.map(({ henries }) => NANO * henries) }]}
          marks={
            wanted === undefined
              ? []
              : [{ axis: 'y', at: NANO * wanted, words: `wanted ${henryText(wanted)}` }]
          }
        />
      }
      table={
        <DataTable
          label="A turn more or less"
          columns={[
            { key: 'turns', header: 'Turns', cell: ({ turns }) => `${turns} turns` },
            {
              key: 'henries',
              header: 'Inductance',
              align: 'right',
              phone: 'end',
              cell: ({ henries }) => <b>{henryText(henries)}</b>,
            },
            {
              key: 'off',
              header: 'Against what is wanted',
              align: 'right',
              cell: ({ henries }) => (wanted === undefined ? '' : offText(henries, wanted)),
            },
          ]}
          rows={rows}
          rowKey={({ turns }) => String(turns)}
        />
      }
    />
  );
}
