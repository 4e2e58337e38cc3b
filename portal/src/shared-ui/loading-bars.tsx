import Box from '@mui/material/Box';
import { useEffect, useState } from 'react';
import { VisuallyHidden } from './visually-hidden';

const WAIT_MS = 300;
const WIDTHS = ['46%', '100%', '82%', '94%', '64%', '88%'];

interface LoadingBarsProps {
  /** About as many as the rows that will come. */
  rows?: number;
  /** What is on its way, for a screen reader: "Loading bookings". */
  label?: string;
}

/** Sunk bars where rows will be, and only when the answer takes longer than 300 ms. */
export function LoadingBars({ rows = 3, label = 'Loading' }: LoadingBarsProps) {
  const [isSlow, setIsSlow] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setIsSlow(true), WAIT_MS);
    return () => clearTimeout(timer);
  }, []);
  return (
    <Box role="status" sx={{ py: '10px', minHeight: rows * 20 + 20 }}>
      {isSlow && (
        <>
          <VisuallyHidden>{label}</VisuallyHidden>
          {Array.from({ length: rows }, (_, row) => (
            <Box
              key={row}
              sx={{
                width: WIDTHS[row % WIDTHS.length],
                height: 12,
                mb: '8px',
                border: '1px solid',
                borderColor: 'token.rule',
                backgroundColor: 'token.sunk',
              }}
            />
          ))}
        </>
      )}
    </Box>
  );
}
