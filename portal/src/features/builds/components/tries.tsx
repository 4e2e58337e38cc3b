import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { formatInClubZone } from '../../../lib/club-time-text';
import { AssetTag } from '../../../shared-ui/asset-tag';
import { VerdictLine } from '../../../shared-ui/states/state-line';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import type { BuildCheck } from '../api/builds';
import { readingSentence } from '../logic/words';

/** Every reading kept on a check, the one in force last; those before it stay in the record. */
export function Tries({ check }: { check: Pick<BuildCheck, 'readings'> }) {
  const { readings } = check;
  if (readings.length === 0) return null;
  return (
    <Box sx={{ mt: '10px' }}>
      {readings.map((reading) => (
        <Box
          key={reading.id}
          sx={{
            display: 'flex',
            flexWrap: 'wrap',
            justifyContent: 'space-between',
            alignItems: 'center',
            gap: '2px 12px',
            py: '7px',
            borderBottom: '1px solid',
            borderColor: 'token.rule',
          }}
        >
          <span>
            <Box
              component="b"
              sx={{ mr: '8px', textDecoration: reading.isSuperseded ? 'line-through' : 'none' }}
            >
              {readingSentence(reading)}
            </Box>
            <Typography variant="small" sx={{ color: 'token.ink2' }}>
              {formatInClubZone(reading.takenAt)}{' '}
              {reading.instrumentTag && <AssetTag>{reading.instrumentTag}</AssetTag>}
            </Typography>
          </span>
          <VerdictLine verdict={reading.verdict}>{VERDICTS[reading.verdict].short}</VerdictLine>
        </Box>
      ))}
      {readings.length > 1 && (
        <Typography variant="small" component="p" sx={{ m: 0, pt: '6px', color: 'token.ink2' }}>
          {readings.length === 2 ? 'Both tries stay' : 'All tries stay'} in the build record.
        </Typography>
      )}
    </Box>
  );
}
