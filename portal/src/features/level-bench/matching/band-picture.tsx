import { formatQuantity } from '@ferrite-row/levels';
import { DataTable } from '../../../shared-ui/data-table';
import { ChartOrTable } from '../results/chart-or-table';
import { PlainChart } from '../results/plain-chart';
import type { BandSheet } from './conductor';
import { WireSection } from './wire-section';

const MEGA = 1e6;

/** A figure over the bands, and the wire it is of. */
export function BandPicture({ sheet }: { sheet: BandSheet }) {
  const { rows, quantity, limit, wire } = sheet;
  const title = `${quantity.name} over the bands`;
  return (
    <>
      {wire && <WireSection {...wire} />}
      <ChartOrTable
        title={title}
        chart={
          <PlainChart
            words={`${title}, falling from 160 to 6 m`}
            x={{ label: 'Frequency, MHz', scale: 'log' }}
            y={{ label: `${quantity.name}, ${quantity.unit}`, from: 0 }}
            at={rows.map(({ hertz }) => hertz / MEGA)}
            lines={[{ name: quantity.name, values: rows.map(({ value }) => value) }]}
            marks={limit ? [{ axis: 'y', at: limit.value, words: limit.words, tone: 'oxide' }] : []}
          />
        }
        table={
          <DataTable
            label={title}
            columns={[
              { key: 'hertz', header: 'Frequency', cell: ({ hertz }) => formatQuantity(hertz, 'Hz') },
              {
                key: 'value',
                header: quantity.name,
                align: 'right',
                phone: 'end',
                cell: ({ value }) => `${Number(value.toPrecision(3))} ${quantity.unit}`,
              },
            ]}
            rows={rows}
            rowKey={({ hertz }) => String(hertz)}
          />
        }
      />
    </>
  );
}
