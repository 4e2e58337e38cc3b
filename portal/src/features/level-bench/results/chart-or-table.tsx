import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import { usePreference } from '../../../shared-ui/use-preference';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { ViewSwitch } from '../../../shared-ui/view-switch';

interface ChartOrTableProps {
  title: string;
  legend?: ReactNode;
  chart: ReactNode;
  table: ReactNode;
}

/** A chart and the table that says the same; one switch for all of the bench, remembered. The table is the one a screen reader is given. */
export function ChartOrTable({ title, legend, chart, table }: ChartOrTableProps) {
  const [view, setView] = usePreference('level-bench-view', ['chart', 'table']);
  return (
    <Box component="section" aria-label={title} sx={{ mt: '18px' }}>
      <SectionHeading end={<ViewSwitch value={view} drawing="chart" words="Chart" onChange={setView} />}>
        {title}
      </SectionHeading>
      {view === 'chart' && legend}
      {view === 'chart' ? chart : table}
    </Box>
  );
}
