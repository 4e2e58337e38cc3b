import Box from '@mui/material/Box';
import { DataTable } from '../../../shared-ui/data-table';
import { SectionHeading } from '../../../shared-ui/section-heading';
import type { Figure } from './sheet';

/** Every figure of a calculation with its name. */
export function FigureTable({ figures, title = 'Figures' }: { figures: readonly Figure[]; title?: string }) {
  return (
    <Box component="section" aria-label={title} sx={{ mt: '18px' }}>
      <SectionHeading>{title}</SectionHeading>
      <DataTable
        label={title}
        columns={[
          { key: 'name', header: 'Figure', cell: ({ name }) => name },
          { key: 'figure', header: 'Value', cell: ({ figure }) => figure, align: 'right', phone: 'end' },
        ]}
        rows={figures}
        rowKey={({ name, figure }) => `${name} ${figure}`}
      />
    </Box>
  );
}
