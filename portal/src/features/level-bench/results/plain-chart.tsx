import { ChartsReferenceLine } from '@mui/x-charts/ChartsReferenceLine';
import { LineChart } from '@mui/x-charts/LineChart';
import Box from '@mui/material/Box';
import { useWidth } from '../../../shared-ui/level-diagram/use-width';
import { token, type TokenName } from '../../../shared-ui/tokens';

interface ChartAxis {
  /** With its unit: "Frequency, MHz". */
  label: string;
  from?: number;
  to?: number;
  scale?: 'linear' | 'log';
  /** Small at the top: losses. */
  isReversed?: boolean;
  format?: (value: number) => string;
  /** Least step between two figures of the axis: 1 for what is counted. */
  leastStep?: number;
}

interface ChartLine {
  name: string;
  values: readonly (number | null)[];
}

interface ChartMark {
  axis: 'x' | 'y';
  at: number;
  words: string;
  /** Oxide is a limit, copper what is being entered. */
  tone?: Extract<TokenName, 'ink2' | 'oxide' | 'copper'>;
}

interface PlainChartProps {
  /** What it shows, in a sentence for who does not see it. */
  words: string;
  x: ChartAxis;
  y: ChartAxis;
  at: readonly number[];
  lines: readonly ChartLine[];
  /** Lines across the chart at a value of an axis, with their words. */
  marks?: readonly ChartMark[];
  /** Points between two marks of a line; 1 marks every point. */
  markEvery?: number;
}

/** Series in this order; their marks differ in shape too. */
const COLOURS: readonly TokenName[] = ['green', 'ink', 'trace', 'brass'];

const USUAL_WIDTH = 838;
const HEIGHT = 300;

const AXIS_TEXT = { fontSize: 11, fontFamily: 'inherit', fill: token('ink2') };

const LOOK = {
  '& .MuiChartsGrid-line': { stroke: token('rule') },
  '& .MuiChartsAxis-line, & .MuiChartsAxis-tick': { stroke: token('edge') },
  '& .MuiChartsAxis-tickLabel, & .MuiChartsAxis-label': { fill: token('ink2') },
  '& .MuiLineChart-line': { strokeWidth: 2.2 },
  '& .MuiMarkElement-root, & .MuiLineChart-mark': { fill: token('paper') },
} as const;

const axisOf = ({ label, from, to, scale = 'linear', isReversed, format, leastStep }: ChartAxis) => ({
  label,
  min: from,
  max: to,
  scaleType: scale,
  reverse: isReversed,
  valueFormatter: format,
  tickMinStep: leastStep,
  labelStyle: AXIS_TEXT,
  tickLabelStyle: AXIS_TEXT,
});

/** A plain chart in the notebook's colours; give it its table with `ChartOrTable`. */
export function PlainChart({ words, x, y, at, lines, marks = [], markEvery = 1 }: PlainChartProps) {
  const [frame, width] = useWidth<HTMLDivElement>(USUAL_WIDTH);
  return (
    <Box ref={frame} sx={{ minWidth: 0, mt: '8px' }}>
      <LineChart
        width={width}
        height={HEIGHT}
        title={words}
        skipAnimation
        hideLegend={lines.length === 1}
        grid={{ horizontal: true, vertical: true }}
        margin={{ left: 0, right: 16, top: 12, bottom: 0 }}
        xAxis={[{ ...axisOf(x), data: [...at], domainLimit: 'strict' }]}
        yAxis={[{ ...axisOf(y), width: 56 }]}
        series={lines.map(({ name, values }, index) => ({
          label: name,
          data: [...values],
          color: token(COLOURS[index % COLOURS.length] ?? 'ink'),
          showMark: ({ index: point }: { index: number }) => point % markEvery === 0,
          curve: 'linear' as const,
        }))}
        sx={LOOK}
      >
        {marks.map(({ axis, at: value, words: label, tone = 'ink2' }) => (
          <ChartsReferenceLine
            key={`${axis} ${label}`}
            {...(axis === 'x' ? { x: value } : { y: value })}
            label={label}
            labelAlign="end"
            lineStyle={{ stroke: token(tone), strokeWidth: 1.5, strokeDasharray: '4 3' }}
            labelStyle={{ ...AXIS_TEXT, fontWeight: 700, fill: token(tone) }}
          />
        ))}
      </LineChart>
    </Box>
  );
}
