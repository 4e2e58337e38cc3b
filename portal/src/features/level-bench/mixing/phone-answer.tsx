import Box from '@mui/material/Box';
import { memo } from 'react';
import { fixed, signed } from '../../../lib/text';
import { token } from '../../../shared-ui/tokens';
import { driveWords, padText } from './answer-words';
import { megahertz } from './words';
import type { Mixing } from './work-out';

const LINE = {
  display: 'flex',
  alignItems: 'center',
  justifyContent: 'space-between',
  gap: '4px 12px',
  px: '16px',
} as const;

const END = { textAlign: 'right', typography: 'small', color: 'token.ink2' } as const;

/** The same answer in two lines over the bottom bar. */
export const PhoneAnswer = memo(function PhoneAnswer({
  mixing,
  isStale,
}: {
  mixing: Mixing;
  isStale: boolean;
}) {
  const { wanted, conversion, band, values, drive } = mixing;
  const strong = isStale ? 'token.ink3' : 'token.ink';
  const isIn = wanted.verdict === 'pass';
  const { advice, then } = driveWords(drive);
  return (
    <Box component="section" aria-label="Answer" sx={{ color: strong, backgroundColor: 'token.sheet' }}>
      <Box sx={{ ...LINE, py: '8px' }}>
        <Box sx={{ typography: 'reading', whiteSpace: 'nowrap' }}>
          {megahertz(wanted.hertz)}{' '}
          <Box component="span" sx={{ fontSize: '0.9375rem', fontWeight: 600, color: 'token.ink2' }}>
            MHz
          </Box>
        </Box>
        <Box sx={END}>
          <Box sx={{ fontWeight: 700, color: strong }}>Sideband {conversion.sideband}</Box>
          <Box sx={isIn ? undefined : { color: 'token.brass', fontWeight: 700 }}>
            {isIn ? `in the ${band.band} band` : 'in no amateur band'}
          </Box>
        </Box>
      </Box>
      <Box
        sx={{
          ...LINE,
          py: '8px',
          borderTop: `1px solid ${token('rule')}`,
          ...(drive.drive !== 'right' && { backgroundColor: 'token.brassTint' }),
        }}
      >
        <Box sx={{ typography: 'small', color: 'token.ink2' }}>
          <Box>
            Drive {signed(values.sourceDbm)} against {signed(values.ratedDbm, 0)} dBm
          </Box>
          <Box sx={{ fontWeight: 700, color: strong }}>{advice}</Box>
        </Box>
        <Box sx={{ ...END, flex: '0 1 auto' }}>
          {drive.pad ? (
            <>
              <Box sx={{ fontWeight: 700, color: strong }}>{padText(drive.pad)}</Box>
              <Box>pi pad, really {fixed(drive.pad.fitted.lossDb, 2)} dB</Box>
            </>
          ) : (
            then
          )}
        </Box>
      </Box>
    </Box>
  );
});
