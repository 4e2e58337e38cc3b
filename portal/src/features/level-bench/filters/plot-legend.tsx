import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import { token } from '../../../shared-ui/tokens';

const Entry = ({ mark, children }: { mark: ReactNode; children: ReactNode }) => (
  <Box component="span" sx={{ display: 'inline-flex', alignItems: 'center', gap: '7px' }}>
    {mark}
    {children}
  </Box>
);

const line = (colour: 'green' | 'ink', opacity: number, width: number) => (
  <svg width="22" height="12" aria-hidden>
    <rect y="1" width="22" height="10" fill={token(colour)} fillOpacity={opacity} />
    <path d="M0 6h22" stroke={token(colour)} strokeWidth={width} />
  </svg>
);

/** What the marks of the filter plot mean. */
export const PlotLegend = () => (
  <Box
    aria-hidden
    sx={{
      display: 'flex',
      flexWrap: 'wrap',
      gap: '2px 16px',
      typography: 'least',
      fontWeight: 400,
      color: 'token.ink2',
    }}
  >
    <Entry mark={line('green', 0.24, 2.2)}>Gain, 95 % of 1,000 builds</Entry>
    <Entry mark={line('ink', 0.14, 1.8)}>Return loss</Entry>
    <Entry
      mark={
        <svg width="22" height="12" fill="none">
          <path d="M0 2h22" stroke={token('oxide')} strokeWidth="2.4" />
          <path d="M1 11l6-7M6 11l6-7M11 11l6-7M16 11l6-7" stroke={token('brassFill')} />
        </svg>
      }
    >
      Limit, and what is in hand
    </Entry>
  </Box>
);
