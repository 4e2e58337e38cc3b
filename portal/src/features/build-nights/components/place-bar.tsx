import Box from '@mui/material/Box';
import { countWord } from '../../../lib/text';
import type { BuildNight } from '../api/nights';

const MOST_DRAWN = 24;

interface PlaceBarProps {
  night: Pick<BuildNight, 'coming' | 'places' | 'waiting'>;
  /** After the count: who is mentoring. */
  children?: React.ReactNode;
}

/** Places as boxes, filled as far as they are taken; the words below say the same. */
export function PlaceBar({ night: { coming, places, waiting }, children }: PlaceBarProps) {
  const waits = waiting === 0 ? undefined : `${countWord(waiting)} waiting`;
  return (
    <>
      {places <= MOST_DRAWN && (
        <Box aria-hidden sx={{ display: 'flex', gap: '3px', mt: '6px', height: 14 }}>
          {Array.from({ length: places }, (_, place) => (
            <Box
              key={place}
              sx={{
                flex: 1,
                border: '1px solid',
                borderColor: place < coming ? 'token.green' : 'token.edge',
                backgroundColor: place < coming ? 'token.green' : 'transparent',
              }}
            />
          ))}
        </Box>
      )}
      <Box sx={{ mt: '4px', fontSize: '0.8125rem' }}>
        <b>
          {coming} of {places} {places === 1 ? 'place' : 'places'}
        </b>{' '}
        taken{waits && <b>, {waits}</b>}
        {children}
      </Box>
    </>
  );
}
