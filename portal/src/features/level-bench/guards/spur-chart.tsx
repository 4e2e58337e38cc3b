import Box from '@mui/material/Box';
import { BarChart } from '@mui/x-charts/BarChart';
import { ChartsReferenceLine } from '@mui/x-charts/ChartsReferenceLine';
import { signed } from '../../../lib/text';
import { token } from '../../../shared-ui/tokens';
import type { SpurPicture } from './spurious';

const HEIGHT = 250;
const LABEL = { fontSize: 11, fontWeight: 600 };
const SX = {
  '& .MuiChartsAxis-line, & .MuiChartsAxis-tick': { stroke: token('edge') },
  '& .MuiChartsAxis-tickLabel, & .MuiChartsAxis-label': { fill: `${token('ink2')} !important` },
  '& .MuiChartsGrid-line': { stroke: token('rule') },
};

const LEGEND = {
  display: 'flex',
  flexWrap: 'wrap',
  gap: '2px 16px',
  pt: '8px',
  typography: 'least',
  fontWeight: 400,
  color: 'token.ink2',
  '& > span': { display: 'inline-flex', alignItems: 'center', gap: '7px' },
} as const;

const dbc = (value: number | null): string => (value === null ? '' : `${signed(value)} dBc`);

/** How far each emission hangs below the carrier, as measured and with the filter, and the limit it must pass. */
export function SpurChart({ picture: { limitDbc, spurs } }: { picture: SpurPicture }) {
  const lowest = Math.min(limitDbc, ...spurs.flatMap((spur) => [spur.dbc, spur.filteredDbc ?? 0]));
  const hasFilter = spurs.some(({ filteredDbc }) => filteredDbc !== null);
  return (
    <Box aria-hidden>
      <BarChart
        height={HEIGHT}
        margin={{ left: 0, right: 8, top: 8, bottom: 0 }}
        xAxis={[
          {
            data: spurs.map(({ name }) => name.replace(' harmonic', '')),
            scaleType: 'band',
            position: 'top',
            height: 26,
            categoryGapRatio: 0.5,
            tickLabelStyle: LABEL,
            disableTicks: true,
          },
        ]}
        yAxis={[
          {
            min: Math.floor(lowest / 10) * 10,
            max: 0,
            width: 52,
            label: 'dBc',
            labelStyle: LABEL,
            tickLabelStyle: LABEL,
          },
        ]}
        series={[
          {
            data: spurs.map((spur) => spur.dbc),
            label: 'Measured',
            color: token('ink'),
            valueFormatter: dbc,
          },
          ...(hasFilter
            ? [
                {
                  data: spurs.map(({ filteredDbc }) => filteredDbc),
                  label: 'With the filter',
                  color: token('green'),
                  valueFormatter: dbc,
                },
              ]
            : []),
        ]}
        grid={{ horizontal: true }}
        hideLegend
        disableKeyboardNavigation
        skipAnimation
        sx={SX}
      >
        <ChartsReferenceLine y={limitDbc} lineStyle={{ stroke: token('oxide'), strokeWidth: 2.4 }} />
      </BarChart>
    </Box>
  );
}

const MARKS = [
  ['ink', 'Measured, left'],
  ['green', 'With the filter, right'],
] as const;

/** The marks of the chart; the two bars are told apart by their place too. */
export const SpurLegend = ({ picture }: { picture: SpurPicture }) => (
  <Box aria-hidden sx={LEGEND}>
    {MARKS.map(([colour, name]) => (
      <span key={name}>
        <svg width="12" height="12">
          <rect width="12" height="12" fill={token(colour)} />
        </svg>
        {name}
      </span>
    ))}
    <span>
      <svg width="22" height="12">
        <path d="M0 6h22" stroke={token('oxide')} strokeWidth="2.4" />
      </svg>
      {`Limit, ${dbc(picture.limitDbc)}`}
    </span>
  </Box>
);
