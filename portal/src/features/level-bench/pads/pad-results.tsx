import Box from '@mui/material/Box';
import { memo } from 'react';
import { SectionHeading } from '../../../shared-ui/section-heading';
import type { WorkedPad } from './figures';
import { PadPicture } from './pad-picture';
import { PadTable } from './pad-table';
import { PowerStrip } from './power-strip';

/** The pad drawn, its resistors, and where the power goes; drawn with a new result, not with every key. */
export const PadResults = memo(function PadResults({ worked }: { worked: WorkedPad }) {
  return (
    <>
      <PadPicture worked={worked} />
      <Box component="section" aria-label="Resistors" sx={{ mt: '18px' }}>
        <SectionHeading>Resistors</SectionHeading>
        <PadTable worked={worked} />
      </Box>
      <PowerStrip worked={worked} />
    </>
  );
});
