import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useMemo } from 'react';
import { usePreference } from '../../../shared-ui/use-preference';
import { ViewSwitch } from '../../../shared-ui/view-switch';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import type { FilterBuilds } from './builds';
import type { FilterFigures } from './figures';
import { FilterPlot } from './filter-plot';
import type { Judged } from './judged';
import { PlotLegend } from './plot-legend';
import { responseRows } from './response-rows';
import { ResponseTable } from './response-table';
import type { ReactNode } from 'react';

interface ResponseSectionProps {
  figures: FilterFigures;
  judged: Judged;
  built: FilterBuilds | undefined;
  isStale: boolean;
  /** What stands at its right. */
  children: ReactNode;
}

/** The plot or its table; the table is always there for a screen reader. T switches. */
export function ResponseSection({ children, ...shown }: ResponseSectionProps) {
  const { figures, judged, built } = shown;
  const [view, setView] = usePreference('level-bench-view', ['chart', 'table']);
  const rows = useMemo(() => responseRows(figures, judged, built), [figures, judged, built]);
  const isTable = view === 'table';
  return (
    <Box
      component="section"
      aria-label="Response"
      sx={{ mt: '12px' }}
      onKeyDown={(event) => {
        const isPlainT = event.key.toLowerCase() === 't' && !event.ctrlKey && !event.metaKey && !event.altKey;
        if (isPlainT) setView(isTable ? 'chart' : 'table');
      }}
    >
      <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '4px 18px' }}>
        <Typography variant="h2">Response</Typography>
        {!isTable && <PlotLegend />}
        <Box sx={{ ml: 'auto' }}>
          <ViewSwitch value={view} drawing="chart" words="Chart" onChange={setView} />
        </Box>
      </Box>
      <Box
        sx={{
          display: 'grid',
          gridTemplateColumns: { xs: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 255px' },
          gap: { xs: '16px', lg: '30px' },
          mt: '6px',
        }}
      >
        <Box sx={{ minWidth: 0 }}>
          {isTable ? <ResponseTable rows={rows} /> : <FilterPlot {...shown} />}
          {!isTable && (
            <VisuallyHidden as="div">
              <ResponseTable rows={rows} />
            </VisuallyHidden>
          )}
        </Box>
        <Box sx={{ minWidth: 0, display: 'flex', flexDirection: 'column', gap: '14px' }}>{children}</Box>
      </Box>
    </Box>
  );
}
