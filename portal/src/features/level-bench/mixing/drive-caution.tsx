import { formatQuantity } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import { memo } from 'react';
import { CautionBox } from '../../../shared-ui/caution-box';
import type { Mixing } from './work-out';

/** From here on a radio frequency burns, and a resistor does (common practice). */
const WATTS = 1;

/** Beside a pad that takes real power. */
export const DriveCaution = memo(function DriveCaution({ mixing }: { mixing: Mixing }) {
  const watts = mixing.drive.pad?.resistors.reduce((sum, resistor) => sum + resistor.watts, 0) ?? 0;
  if (watts < WATTS) return null;
  return (
    <Box sx={{ mt: '12px' }}>
      <CautionBox kind="hot parts">
        The pad takes {formatQuantity(watts, 'W', 2)}. Switch the source off before you touch the pad or its
        leads, and give it time to cool. The rules of your room go further.
      </CautionBox>
    </Box>
  );
});
