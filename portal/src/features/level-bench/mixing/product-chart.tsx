import Box from '@mui/material/Box';
import { memo, useMemo, useState, type KeyboardEvent, type MouseEvent } from 'react';
import { useWidth } from '../../../shared-ui/level-diagram/use-width';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import { usePhone } from '../../../shared-ui/use-phone';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import { ChartDrawing } from './chart-drawing';
import { marksOf, nearestMark, stepFrom, type Step } from './marks';
import type { ProductRow } from './rows';
import { scaleOf } from './scale';
import { chartSummary, spokenProduct } from './words';
import type { Mixing } from './work-out';

interface ProductChartProps {
  mixing: Mixing;
  shown: readonly ProductRow[];
  rest: readonly ProductRow[];
  /** Marks the row of a product. */
  onMark: (name: string) => void;
  /** Leads to the table. */
  onTable: () => void;
}

const USUAL_WIDTH = 838;

const STEPS: Readonly<Record<string, Step>> = {
  ArrowLeft: 'left',
  ArrowRight: 'right',
  ArrowUp: 'up',
  ArrowDown: 'down',
  Home: 'first',
  End: 'last',
};

/** Products on a frequency axis, before and after the filter. One tab stop; the arrows step through the products. */
export const ProductChart = memo(function ProductChart(props: ProductChartProps) {
  const { mixing, shown, rest, onMark, onTable } = props;
  const isPhone = usePhone();
  const [frame, width] = useWidth<HTMLDivElement>(USUAL_WIDTH);
  const [focusName, setFocusName] = useState<string>();
  const strongest = Math.max(...shown.map(({ product }) => product.levelDbm));
  const scale = useMemo(
    () => scaleOf({ width, isPhone }, mixing.maxHertz, strongest),
    [width, isPhone, mixing.maxHertz, strongest],
  );
  const named = useMemo(() => marksOf(shown, scale), [shown, scale]);
  const thin = useMemo(() => marksOf(rest, scale), [rest, scale]);
  const all = useMemo(() => [...named, ...thin], [named, thin]);
  const focused = all.find(({ row }) => row.product.name === focusName);

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const step = STEPS[event.key];
    if (step) setFocusName(stepFrom(all, focusName, step));
    else if (event.key === 'Enter' && focused) onMark(focused.row.product.name);
    else if (event.key.toLowerCase() === 't') onTable();
    else return;
    event.preventDefault();
  };
  const onClick = ({ clientX, clientY, currentTarget }: MouseEvent) => {
    const { left, top } = currentTarget.getBoundingClientRect();
    const mark = nearestMark(all, clientX - left, clientY - top);
    setFocusName(mark?.row.product.name);
    if (mark) onMark(mark.row.product.name);
  };
  return (
    <Box
      ref={frame}
      role="group"
      tabIndex={0}
      aria-label="Product chart. Left and Right step by frequency, Up and Down by what is in hand, Enter marks the row, T leads to the table."
      onKeyDown={onKeyDown}
      onBlur={() => setFocusName(undefined)}
      onClick={onClick}
      sx={{ width: '100%', minWidth: 0, lineHeight: 0 }}
    >
      <svg role="img" aria-label={chartSummary(mixing)} width={width} height={scale.height}>
        <ChartDrawing {...{ mixing, scale, named, thin, focused }} />
      </svg>
      <VisuallyHidden>
        <span role="status">
          {focused ? spokenProduct(focused.row, VERDICTS[focused.row.product.verdict].words) : ''}
        </span>
      </VisuallyHidden>
    </Box>
  );
});
