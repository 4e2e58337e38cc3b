import Box from '@mui/material/Box';
import { useRef, type ReactNode } from 'react';
import { usePhone } from '../../../shared-ui/use-phone';
import { useToastsAbove } from '../../../shared-ui/use-toasts-above';

/** What to do with the opened line, and the totals under it: always in sight beside the rows on a wide screen. */
export function ReconcileFoot({ children }: { children: ReactNode }) {
  const foot = useRef<HTMLDivElement>(null);
  useToastsAbove(foot, !usePhone());
  return (
    <Box
      ref={foot}
      sx={{
        // No box on a phone: there the totals alone stay in sight, over the whole page.
        display: { xs: 'contents', md: 'block' },
        position: { md: 'sticky' },
        bottom: 0,
        zIndex: 2,
        mb: { md: '-40px' },
        backgroundColor: 'token.paper',
      }}
    >
      {children}
    </Box>
  );
}
