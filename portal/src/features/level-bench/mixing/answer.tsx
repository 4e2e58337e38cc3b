import Box from '@mui/material/Box';
import { memo, type ReactNode } from 'react';
import { signed } from '../../../lib/text';
import { token } from '../../../shared-ui/tokens';
import { driveWords, placeWords, sidebandFigure, sidebandWords } from './answer-words';
import { DrivePad } from './drive-pad';
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

/** One style for all of it: it is drawn with every key. */
const SECTION = {
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 213fr) minmax(0, 176fr) minmax(0, 449fr)',
  border: `1.5px solid ${token('ink')}`,
  borderRadius: '3px',
  backgroundColor: token('sheet'),
  color: token('ink'),
  overflow: 'hidden',
  '& .cell': {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: '4px 10px',
    padding: '10px 18px 12px',
    minHeight: 128,
    borderLeft: `1px solid ${token('rule')}`,
  },
  '& .cell:first-of-type': { borderLeft: 0 },
  '& .cell[data-caution]': { backgroundColor: token('brassTint') },
  '& .said': { flex: '1 1 0', minWidth: 150, alignSelf: 'flex-start' },
  '& h2, & .words': {
    margin: 0,
    fontSize: '0.78125rem',
    lineHeight: '1.125rem',
    fontWeight: 400,
    color: token('ink2'),
  },
  '& .words b': { color: token('ink') },
  '& .figure': { display: 'flex', alignItems: 'center', minHeight: 36, marginBottom: '4px', fontWeight: 700 },
  '& .large': { fontSize: '2.0625rem', lineHeight: '2.25rem', letterSpacing: '-0.02em' },
  '& .middle': { fontSize: '1.25rem' },
  '& .drive': { fontSize: '1.125rem', whiteSpace: 'nowrap' },
  '& .drive small': { fontSize: '0.84375rem' },
  '& .large small': { fontSize: '0.875rem', fontWeight: 600, letterSpacing: 0, color: token('ink2') },
  '&[data-stale], &[data-stale] b': { color: token('ink3') },
} as const;

function Cell({ name, figure, words, isCaution = false, drawing }: CellProps) {
  return (
    <div className="cell" data-caution={isCaution || undefined}>
      <div className="said">
        <h2>{name}</h2>
        <div className="figure">{figure}</div>
        <div className="words">{words}</div>
      </div>
      {drawing}
    </div>
  );
}

/** The answer in words and figures: wanted frequency, sideband, and the drive with its pad. */
export const Answer = memo(function Answer({ mixing, isStale }: { mixing: Mixing; isStale: boolean }) {
  const { wanted, values, drive } = mixing;
  const { advice, then } = driveWords(drive);
  return (
    <Box component="section" aria-label="Answer" data-stale={isStale || undefined} sx={SECTION}>
      <Cell
        name={`${wanted.name}, order 2`}
        figure={
          <span className="large">
            {megahertz(wanted.hertz)} <small>MHz</small>
          </span>
        }
        words={placeWords(mixing)}
        isCaution={wanted.verdict !== 'pass'}
      />
      <Cell
        name="Sideband"
        figure={<span className="middle">{sidebandFigure(mixing)}</span>}
        words={sidebandWords(mixing)}
      />
      <Cell
        name="Drive"
        isCaution={drive.drive !== 'right'}
        figure={
          <span className="drive">
            {signed(values.sourceDbm)} <small>dBm against</small>{' '}
            {signed(values.ratedDbm, Number.isInteger(values.ratedDbm) ? 0 : 1)}
          </span>
        }
        words={
          <>
            <b>{advice}</b> {then}
          </>
        }
        drawing={drive.pad && <DrivePad pad={drive.pad} />}
      />
    </Box>
  );
});
