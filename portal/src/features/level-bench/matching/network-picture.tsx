import Box from '@mui/material/Box';
import { formatQuantity } from '@ferrite-row/levels';
import { DataTable } from '../../../shared-ui/data-table';
import { fixed } from '../../../lib/text';
import { useWidth } from '../../../shared-ui/level-diagram/use-width';
import { ChartOrTable } from '../results/chart-or-table';
import { PlainChart } from '../results/plain-chart';
import {
  elementsText,
  exactText,
  fitText,
  goodText,
  lossText,
  type FittedNetwork,
  type NetworkSheet,
} from './l-network';
import { NetworkDrawing } from './network-drawing';

const MEGA = 1e6;
const USUAL_WIDTH = 380;

/** Deeper than the chart's foot no bench can tell. */
const FOOT_DB = 40;

function Network({ network, sheet }: { network: FittedNetwork; sheet: NetworkSheet }) {
  const [frame, width] = useWidth<HTMLDivElement>(USUAL_WIDTH);
  return (
    <Box
      component="section"
      aria-label={network.name}
      sx={{
        border: '1px solid',
        borderColor: 'token.rule',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
        p: '10px 14px',
        minWidth: 0,
      }}
    >
      <Box
        sx={{
          display: 'flex',
          flexWrap: 'wrap',
          justifyContent: 'space-between',
          gap: '2px 12px',
          typography: 'small',
          color: 'token.ink2',
        }}
      >
        <b>{network.name}</b>
        <span>{[lossText(network), goodText(network)].filter(Boolean).join(', ')}</span>
      </Box>
      <div ref={frame}>
        <NetworkDrawing
          elements={network.elements}
          values={network.elements.map(fitText)}
          ends={[formatQuantity(sheet.sourceOhms, 'ohm'), sheet.loadText]}
          width={width}
          words={`${network.name}: ${elementsText(network)}`}
        />
      </div>
      <Box sx={{ typography: 'small', color: 'token.ink3' }}>
        exact {network.elements.map((element) => `${element.name} ${exactText(element)}`).join(', ')}
      </Box>
    </Box>
  );
}

/** Points of the grid between two rows of the table. */
const EVERY = 20;

/** Every network drawn with its values, and what comes back over frequency. */
export function NetworkPicture({ sheet }: { sheet: NetworkSheet }) {
  const { hertz, networks, atHertz } = sheet;
  const megahertz = Array.from(hertz, (value) => value / MEGA);
  return (
    <>
      <Box
        sx={{
          display: 'grid',
          gridTemplateColumns: { xs: 'minmax(0, 1fr)', md: 'repeat(2, minmax(0, 1fr))' },
          gap: '10px',
          mt: '10px',
        }}
      >
        {networks.map((network, index) => (
          <Network key={index} network={network} sheet={sheet} />
        ))}
      </Box>
      <ChartOrTable
        title="Return loss"
        chart={
          <PlainChart
            words={networks.map((network) => `${network.name}: ${goodText(network)}`).join('. ')}
            x={{ label: 'Frequency, MHz', format: (value) => fixed(value, 1) }}
            y={{ label: 'Return loss, dB', from: 0, to: FOOT_DB, isReversed: true }}
            at={megahertz}
            lines={networks.map(({ name, curve }) => ({
              name,
              values: Array.from(curve, (db) => Math.min(db, FOOT_DB)),
            }))}
            marks={[{ axis: 'x', at: atHertz / MEGA, words: `${fixed(atHertz / MEGA, 2)} MHz` }]}
            markEvery={EVERY}
          />
        }
        table={
          <DataTable
            label="Return loss"
            columns={[
              { key: 'hertz', header: 'Frequency', cell: (index) => `${fixed(megahertz[index], 2)} MHz` },
              ...networks.map(({ name, curve }, column) => ({
                key: `${column}`,
                header: name,
                align: 'right' as const,
                cell: (index: number) => `${fixed(Math.min(curve[index], FOOT_DB), 1)} dB`,
              })),
            ]}
            rows={Array.from({ length: (hertz.length - 1) / EVERY + 1 }, (_, row) => row * EVERY)}
            rowKey={String}
          />
        }
      />
    </>
  );
}
