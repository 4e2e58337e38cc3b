import { BarChart } from '@mui/x-charts/BarChart';
import Box from '@mui/material/Box';
import { fixed } from '../../../lib/text';
import { token } from '../../../shared-ui/tokens';
import { usePhone } from '../../../shared-ui/use-phone';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import { BudgetTable } from './budget-table';
import type { BudgetRow } from './words';

const BAR_HEIGHT = 40;
const AXES = 60;

const SX = {
  '& .MuiChartsAxis-line, & .MuiChartsAxis-tick': { stroke: token('edge') },
  '& .MuiChartsAxis-tickLabel, & .MuiChartsAxis-label': { fill: `${token('ink2')} !important` },
  '& .MuiChartsGrid-line': { stroke: token('rule') },
  '& .MuiChartsBarLabel-root, & .MuiBarLabel-root': { fill: token('ink'), fontWeight: 700 },
};

const LABEL = { fontSize: 11, fontWeight: 600 };

/** Share of each source in the ±, as bars; the table says the same and is there for a screen reader. */
export function BudgetChart({ rows }: { rows: readonly BudgetRow[] }) {
  const isPhone = usePhone();
  return (
    <>
      <Box aria-hidden>
        <BarChart
          layout="horizontal"
          height={rows.length * BAR_HEIGHT + AXES}
          margin={{ left: 0, right: 40, top: 8, bottom: 0 }}
          yAxis={[
            {
              data: rows.map(({ name }) => name),
              scaleType: 'band',
              width: isPhone ? 136 : 170,
              categoryGapRatio: 0.45,
              tickLabelStyle: LABEL,
              disableTicks: true,
            },
          ]}
          xAxis={[
            {
              min: 0,
              max: 100,
              height: 50,
              label: 'Share of the uncertainty’s square, %',
              labelStyle: LABEL,
              tickLabelStyle: LABEL,
            },
          ]}
          series={[
            {
              data: rows.map(({ share }) => share),
              color: token('green'),
              valueFormatter: (share) => `${fixed(share ?? 0, 0)} %`,
              barLabel: ({ value }) => `${fixed(Number(value ?? 0), 0)} %`,
              barLabelPlacement: 'outside',
            },
          ]}
          grid={{ vertical: true }}
          hideLegend
          disableKeyboardNavigation
          skipAnimation
          sx={SX}
        />
      </Box>
      <VisuallyHidden as="div">
        <BudgetTable rows={rows} />
      </VisuallyHidden>
    </>
  );
}
