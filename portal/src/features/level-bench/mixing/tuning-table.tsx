import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { memo } from 'react';
import { DataTable } from '../../../shared-ui/data-table';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { crossingName, receiveWords, tuningWords } from './tuning-words';
import { megahertz } from './words';
import type { Mixing } from './work-out';

/** What happens while the oscillator tunes over the band, and what the same mixer hears the other way round. */
export const TuningTable = memo(function TuningTable({ mixing }: { mixing: Mixing }) {
  const { crossings } = mixing.tuning;
  const receive = receiveWords(mixing);
  return (
    <Box component="section" aria-label="Tuned over the band" sx={{ mt: '22px' }}>
      <SectionHeading end={`${mixing.band.band} band`}>Tuned over the band</SectionHeading>
      <Typography sx={{ mt: '8px', mb: '4px' }}>{tuningWords(mixing)}</Typography>
      {crossings.length > 0 && (
        <DataTable
          label="Products that cross the wanted one"
          columns={[
            { key: 'product', header: 'Product', cell: (row) => crossingName(row) },
            {
              key: 'wanted',
              header: 'Meets the wanted at',
              align: 'right',
              cell: (row) => `${megahertz(row.wantedHertz)} MHz`,
              phone: 'end',
            },
            { key: 'lo', header: 'LO', align: 'right', cell: (row) => `LO ${megahertz(row.loHertz)} MHz` },
            { key: 'order', header: 'Order', align: 'right', cell: (row) => `order ${row.order}` },
          ]}
          rows={crossings}
          rowKey={({ wantedHertz }) => String(wantedHertz)}
        />
      )}
      {receive && <Typography sx={{ mt: '8px', color: 'token.ink2' }}>{receive}</Typography>}
    </Box>
  );
});
