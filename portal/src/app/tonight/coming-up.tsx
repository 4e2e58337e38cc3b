import { useQuery } from '@tanstack/react-query';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { myBookingsQuery } from '../../features/bench-book/api/bench-book';
import { clubDay } from '../../lib/club-time';
import { formatDay, formatSpan, formatTime } from '../../lib/club-time-text';
import { comingNightsQuery } from './evening';

const MOST = 4;

/** What is next after today: one's own bookings, and the nights one is coming to. */
export function ComingUp({ day }: { day: string }) {
  const bookings = useQuery(myBookingsQuery);
  const nights = useQuery(comingNightsQuery(day));
  const own = (bookings.data ?? [])
    .filter(({ startsAt, kind }) => clubDay(startsAt) > day && kind === 'session')
    .map(({ id, startsAt, endsAt, resources }) => ({
      ...{ id, startsAt },
      words: `${resources.map(({ tag }) => tag).join(', ')}, ${formatSpan(startsAt, endsAt)}`,
    }));
  const coming = (nights.data ?? [])
    .filter(({ startsAt, cancelledAt }) => clubDay(startsAt) > day && !cancelledAt)
    .map(({ id, startsAt, title }) => ({ id, startsAt, words: `${title}, ${formatTime(startsAt)}` }));
  const rows = [...own, ...coming]
    .sort((one, other) => one.startsAt.localeCompare(other.startsAt))
    .slice(0, MOST);
  if (rows.length === 0) return null;
  return (
    <Box
      component="section"
      aria-labelledby="coming-up"
      sx={{
        display: 'flex',
        flexWrap: 'wrap',
        alignItems: 'baseline',
        gap: '6px 36px',
        pt: '14px',
        borderTop: '1px solid',
        borderColor: 'token.rule',
      }}
    >
      <Typography variant="h2" id="coming-up">
        Coming up
      </Typography>
      {rows.map(({ id, startsAt, words }) => (
        <Typography key={id} variant="small" component="span">
          <b>{formatDay(startsAt)}</b> {words}
        </Typography>
      ))}
    </Box>
  );
}
