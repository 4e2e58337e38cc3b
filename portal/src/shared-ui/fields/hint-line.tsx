import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import { StateMark } from '../states/shape';

/** The line under a field: an error with its octagon, else the hint. Undefined when there is neither. */
export function hintLine(error: string | undefined, hint: ReactNode): ReactNode {
  if (!error) return hint;
  return (
    <Box component="span" sx={{ display: 'flex', gap: '6px', fontWeight: 600 }}>
      <StateMark name="octagon" size={13} />
      {error}
    </Box>
  );
}
