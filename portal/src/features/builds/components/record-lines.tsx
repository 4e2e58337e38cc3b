import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { formatInClubZone } from '../../../lib/club-time-text';
import type { BuildCheck } from '../api/builds';
import { PhotoList } from './photo-list';
import { Tries } from './tries';

/** What the record holds on a check: every try, the photos, who marked it and when. */
export function RecordLines({ check }: { check: BuildCheck }) {
  const { mark, photos, readings } = check;
  if (!mark && photos.length === 0 && readings.length === 0) return null;
  return (
    <Box sx={{ pl: '28px', pb: '8px' }}>
      {mark && (
        <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
          {mark.by.name}, {formatInClubZone(mark.at)}
        </Typography>
      )}
      <PhotoList photos={photos} />
      {readings.length > 0 && <Tries check={check} />}
    </Box>
  );
}
