import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import { token } from '../../../shared-ui/tokens';

const Entry = ({ mark, children }: { mark: ReactNode; children: ReactNode }) => (
  <Box
    component="span"
    sx={{
      display: 'inline-flex',
      alignItems: 'center',
      gap: '7px',
      typography: 'small',
      color: 'token.ink2',
      whiteSpace: 'nowrap',
    }}
  >
    {mark}
    {children}
  </Box>
);

/** What the marks mean; only those that are in the drawing. */
export function ChartLegend({ hasFilter }: { hasFilter: boolean }) {
  return (
    <Box aria-hidden sx={{ display: 'flex', flexWrap: 'wrap', gap: '2px 20px' }}>
      <Entry
        mark={
          <svg width="12" height="12" stroke={token('ink')} fill="none">
            <path d="M1 2h10" strokeWidth="2" />
            <path d="M6 2v10" strokeWidth="1.6" strokeDasharray="1.6 2.6" />
          </svg>
        }
      >
        Leaving the mixer
      </Entry>
      <Entry
        mark={
          <svg width="8" height="8">
            <circle cx="4" cy="4" r="3.6" fill={token('ink')} />
          </svg>
        }
      >
        After the filter
      </Entry>
      {hasFilter && (
        <Entry
          mark={
            <svg width="24" height="12">
              <path
                d="M0 11C8 11 8 1 12 1s4 10 12 10z"
                fill={token('green')}
                fillOpacity="0.1"
                stroke={token('green')}
                strokeWidth="1.8"
              />
            </svg>
          }
        >
          Filter
        </Entry>
      )}
      <Entry
        mark={
          <svg width="8" height="8">
            <path d="M.5 1h7L4 7z" fill={token('ink3')} />
          </svg>
        }
      >
        Off the scale
      </Entry>
    </Box>
  );
}
