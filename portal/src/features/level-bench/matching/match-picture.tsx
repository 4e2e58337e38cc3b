import { DataTable } from '../../../shared-ui/data-table';
import type { Column } from '../../../shared-ui/data-table-types';
import { fixed } from '../../../lib/text';
import { ChartOrTable } from '../results/chart-or-table';
import { PlainChart } from '../results/plain-chart';
import { chartedMatches, tabledMatches, vswrText, type MatchRow, type MatchSheet } from './match';

const COLUMNS: readonly Column<MatchRow>[] = [
  { key: 'loss', header: 'Return loss', cell: ({ returnLossDb }) => `${returnLossDb} dB` },
  { key: 'vswr', header: 'VSWR', align: 'right', phone: 'end', cell: (row) => <b>{vswrText(row)}</b> },
  {
    key: 'reflection',
    header: 'Reflection coefficient',
    align: 'right',
    cell: ({ reflection }) => reflection.toFixed(3),
  },
  {
    key: 'back',
    header: 'Power that comes back',
    align: 'right',
    cell: ({ reflection }) => `${Number((100 * reflection ** 2).toPrecision(3))} %`,
  },
  {
    key: 'lost',
    header: 'Mismatch loss',
    align: 'right',
    cell: ({ mismatchLossDb }) => `${fixed(mismatchLossDb, 3)} dB`,
  },
];

/** VSWR over return loss, with the match that was told. */
export function MatchPicture({ sheet: { match } }: { sheet: MatchSheet }) {
  const { returnLossDb } = match;
  const isOnChart = returnLossDb !== undefined && returnLossDb >= 3 && returnLossDb <= 40;
  return (
    <ChartOrTable
      title="VSWR and return loss"
      chart={
        <PlainChart
          words="VSWR over return loss, from 5.8 at 3 dB to 1.02 at 40 dB"
          x={{ label: 'Return loss, dB', from: 3, to: 40 }}
          y={{ label: 'VSWR', from: 1, to: 6 }}
          at={chartedMatches.map((row) => row.returnLossDb)}
          lines={[{ name: 'VSWR', values: chartedMatches.map(({ vswr }) => vswr) }]}
          marks={
            isOnChart
              ? [{ axis: 'x', at: returnLossDb, words: `${vswrText(match)} to 1`, tone: 'copper' }]
              : []
          }
          markEvery={10}
        />
      }
      table={
        <DataTable
          label="VSWR and return loss"
          columns={COLUMNS}
          rows={tabledMatches}
          rowKey={(row) => String(row.returnLossDb)}
        />
      }
    />
  );
}
