import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import { token } from '../tokens';
import { LevelDot } from './level-dot';

const Entry = ({ mark, children }: { mark: ReactNode; children: ReactNode }) => (
  <Box
    component="span"
    sx={{
      display: 'inline-flex',
      alignItems: 'center',
      gap: '7px',
      typography: 'least',
      fontWeight: 400,
      color: 'token.ink2',
    }}
  >
    {mark}
    {children}
  </Box>
);

/** What the marks mean; only those that are in the drawing. */
export function Legend({ isEntering, hasMeasured }: { isEntering: boolean; hasMeasured: boolean }) {
  return (
    <Box aria-hidden sx={{ display: 'flex', flexWrap: 'wrap', gap: '2px 16px', pt: '8px', pb: '4px' }}>
      <Entry
        mark={
          <svg width="22" height="12">
            <rect y="1" width="22" height="10" fill={token('green')} fillOpacity="0.2" />
            <path d="M0 6h22" stroke={token('green')} strokeWidth="2.2" />
          </svg>
        }
      >
        Plan and tolerance
      </Entry>
      {hasMeasured && (
        <Entry
          mark={
            <svg width="10" height="16">
              <LevelDot x={5} y={8} yHigh={2} yLow={14} kind="kept" />
            </svg>
          }
        >
          Measured ± uncertainty
        </Entry>
      )}
      {isEntering && (
        <Entry
          mark={
            <svg width="12" height="12" fill="none">
              <circle cx="6" cy="6" r="4" stroke={token('copper')} strokeWidth="2" />
            </svg>
          }
        >
          Being entered
        </Entry>
      )}
      <Entry
        mark={
          <svg width="22" height="12" fill="none">
            <path d="M0 2h22" stroke={token('oxide')} strokeWidth="2.2" />
            <path d="M1 11l6-7M6 11l6-7M11 11l6-7M16 11l6-7" stroke={token('brassFill')} />
          </svg>
        }
      >
        Limit, with headroom in dB
      </Entry>
    </Box>
  );
}
