import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { memo, useCallback, useMemo, useRef, useState } from 'react';
import { usePhone } from '../../../shared-ui/use-phone';
import { usePreference } from '../../../shared-ui/use-preference';
import { ViewSwitch } from '../../../shared-ui/view-switch';
import { ChartLegend } from './chart-legend';
import { ProductChart } from './product-chart';
import { ProductRows } from './product-rows';
import { ProductTable } from './product-table';
import { rowsOf } from './rows';
import { restWords } from './words';
import type { Mixing } from './work-out';

const VIEW = ['level-bench-view', ['chart', 'table']] as const satisfies Parameters<
  typeof usePreference<'chart' | 'table'>
>;

/** Heading, legend and switch; drawn by itself, since none of it follows from the figures. */
const ProductsHead = memo(function ProductsHead({ hasFilter }: { hasFilter: boolean }) {
  const [view, setView] = usePreference(...VIEW);
  return (
    <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '4px 22px', mb: '4px' }}>
      <Typography variant="h2">Products</Typography>
      {view === 'chart' && <ChartLegend hasFilter={hasFilter} />}
      <Box sx={{ ml: 'auto' }}>
        <ViewSwitch value={view} drawing="chart" words="Chart" onChange={setView} />
      </Box>
    </Box>
  );
});

/** Picture and table of the products; the table stands under the picture, or alone with all of them in sight. */
export const Products = memo(function Products({ mixing }: { mixing: Mixing }) {
  const isPhone = usePhone();
  const [view] = usePreference(...VIEW);
  const [isAll, setIsAll] = useState(false);
  const [marked, setMarked] = useState<string>();
  const table = useRef<HTMLDivElement>(null);
  const { shown, rest } = useMemo(() => rowsOf(mixing), [mixing]);
  const rows = useMemo(() => (isAll ? [...shown, ...rest] : shown), [isAll, shown, rest]);
  const onMark = useCallback(
    (name: string) => {
      setMarked(name);
      if (rest.some(({ product }) => product.name === name)) setIsAll(true);
    },
    [rest],
  );
  const onTable = useCallback(() => table.current?.focus(), []);
  // A phone has both below one another, and no room for a switch.
  const isChart = isPhone || view === 'chart';
  const List = isPhone ? ProductRows : ProductTable;
  return (
    <Box component="section" aria-label="Products of the mixer" sx={{ mt: { xs: '4px', md: '16px' } }}>
      {!isPhone && <ProductsHead hasFilter={mixing.curve !== undefined} />}
      {isChart && <ProductChart {...{ mixing, shown, rest, onMark, onTable }} />}
      <Box ref={table} tabIndex={-1} sx={{ mt: '6px', overflowX: 'auto' }}>
        <List {...{ mixing, rows, marked }} />
      </Box>
      <Typography variant="small" component="p" sx={{ m: 0, mt: '8px', color: 'token.ink2' }}>
        {isAll ? `All ${shown.length + rest.length} products.` : restWords(rest, mixing)}{' '}
        {rest.length > 0 && (
          <Button
            size="small"
            variant="text"
            sx={{ minHeight: 0, p: 0, verticalAlign: 'baseline', textDecoration: 'underline' }}
            onClick={() => setIsAll(!isAll)}
          >
            {isAll ? 'Show fewer' : 'Show all'}
          </Button>
        )}
      </Typography>
    </Box>
  );
});
