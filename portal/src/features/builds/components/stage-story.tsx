import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { formatInClubZone } from '../../../lib/club-time-text';
import { Banner } from '../../../shared-ui/banner';
import type { BuildStage } from '../api/builds';

const WORDS = {
  sent: 'Sent by',
  withdrawn: 'Taken back by',
  'sent back': 'Sent back by',
  'signed off': 'Signed off by',
};

/** What stands over a stage that is not simply on the bench: why it is locked, what the mentor said, who signed it off. */
export function StageStory({ stage }: { stage: BuildStage }) {
  const { state, lockedBecause, events } = stage;
  const last = events.at(-1);
  if (state === 'locked')
    return (
      <Banner kind="not allowed" title="This stage is locked.">
        {lockedBecause}
      </Banner>
    );
  if (!last) return null;
  if (state === 'sent back')
    return (
      <Banner kind="needs you" title={`Sent back by ${last.by.name}, ${formatInClubZone(last.at)}.`}>
        “{last.note}”
      </Banner>
    );
  return (
    <Box
      component="ul"
      aria-label="What happened to this stage"
      sx={{ m: 0, mb: '12px', p: 0, listStyle: 'none' }}
    >
      {events.map((event) => (
        <Typography key={event.at + event.kind} variant="small" component="li" sx={{ color: 'token.ink2' }}>
          {WORDS[event.kind]} <b>{event.by.name}</b>, {formatInClubZone(event.at)}
          {event.note && (
            <Box
              component="blockquote"
              sx={{
                m: '4px 0 8px',
                pl: '12px',
                borderLeft: '3px solid',
                borderColor: 'token.rule',
                color: 'token.ink',
              }}
            >
              “{event.note}”
            </Box>
          )}
        </Typography>
      ))}
    </Box>
  );
}
