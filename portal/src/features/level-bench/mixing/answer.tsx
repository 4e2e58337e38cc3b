import Box from '@mui/material/Box';
import { memo, type ReactNode } from 'react';
import { signed } from '../../../lib/text';
import { token } from '../../../shared-ui/tokens';
import { driveWords, placeWords, sidebandFigure, sidebandWords } from './answer-words';
import { PadDrawing } from './pad-drawing';
import { megahertz } from './words';
import type { Mixing } from './work-out';

interface CellProps {
  name: string;
  figure: ReactNode;
  words: ReactNode;
  isCaution?: boolean;
  /** Beside it. */
  drawing?: ReactNode;
}

const SECTION = {
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 213fr) minmax(0, 176fr) minmax(0, 449fr)',
  border: `1.5px solid ${token('ink')}`,
  borderRadius: '3px',
  backgroundColor: token('sheet'),
  overflow: 'hidden',
} as const;

function Cell({ name, figure, words, isCaution = false, drawing }: CellProps) {
  return (
    <Box
      sx={{
        display: 'flex',
        flexWrap: 'wrap',
        alignItems: 'center',
        justifyContent: 'space-between',
        gap: '4px 10px',
        p: '10px 18px 12px',
        minHeight: 128,
        borderLeft: `1px solid ${token('rule')}`,
        '&:first-of-type': { borderLeft: 0 },
        ...(isCaution && { backgroundColor: 'token.brassTint' }),
      }}
    >
      <Box sx={{ flex: '1 1 0', minWidth: 150, alignSelf: 'flex-start' }}>
        <Box component="h2" sx={{ m: 0, typography: 'small', color: 'token.ink2' }}>
          {name}
        </Box>
        <Box sx={{ minHeight: 36, display: 'flex', alignItems: 'center', mb: '4px' }}>{figure}</Box>
        <Box sx={{ typography: 'small', color: 'token.ink2' }}>{words}</Box>
      </Box>
      {drawing}
    </Box>
  );
}

const Unit = ({ children }: { children: ReactNode }) => (
  <Box component="span" sx={{ fontSize: '0.875rem', fontWeight: 600, color: 'token.ink2' }}>
    {children}
  </Box>
);

/** The answer in words and figures: wanted frequency, sideband, and the drive with its pad. */
export const Answer = memo(function Answer({ mixing, isStale }: { mixing: Mixing; isStale: boolean }) {
  const { wanted, values, drive } = mixing;
  const { advice, then } = driveWords(drive);
  return (
    <Box
      component="section"
      aria-label="Answer"
      sx={{ ...SECTION, color: isStale ? 'token.ink3' : 'token.ink' }}
    >
      <Cell
        name={`${wanted.name}, order 2`}
        figure={
          <Box sx={{ typography: 'reading' }}>
            {megahertz(wanted.hertz)} <Unit>MHz</Unit>
          </Box>
        }
        words={placeWords(mixing)}
        isCaution={wanted.verdict !== 'pass'}
      />
      <Cell
        name="Sideband"
        figure={<Box sx={{ fontSize: '1.25rem', fontWeight: 700 }}>{sidebandFigure(mixing)}</Box>}
        words={sidebandWords(mixing)}
      />
      <Cell
        name="Drive"
        isCaution={drive.drive !== 'right'}
        figure={
          <Box sx={{ fontSize: '1.125rem', fontWeight: 700, whiteSpace: 'nowrap' }}>
            {signed(values.sourceDbm)}{' '}
            <Box component="span" sx={{ fontSize: '0.84375rem' }}>
              dBm against
            </Box>{' '}
            {signed(values.ratedDbm, Number.isInteger(values.ratedDbm) ? 0 : 1)}
          </Box>
        }
        words={
          <>
            <Box component="b" sx={{ color: isStale ? 'token.ink3' : 'token.ink' }}>
              {advice}
            </Box>{' '}
            {then}
          </>
        }
        drawing={drive.pad && <PadDrawing pad={drive.pad} />}
      />
    </Box>
  );
});
