import { useQuery } from '@tanstack/react-query';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { benchesQuery, type Booking } from '../../features/bench-book/api/bench-book';
import { minutesBetween } from '../../lib/club-time';
import { formatTime } from '../../lib/club-time-text';
import { capital, counted } from '../../lib/text';
import { AssetTag } from '../../shared-ui/asset-tag';
import { SectionHeading } from '../../shared-ui/section-heading';
import { dayBookingsQuery } from './evening';

const isOn = ({ startsAt, endsAt }: Booking, now: Date): boolean =>
  minutesBetween(startsAt, now) >= 0 && minutesBetween(now, endsAt) > 0;

/** Who is at which bench now, and with what. */
export function BenchRow({ day, now }: { day: string; now: Date }) {
  const benches = useQuery(benchesQuery);
  const bookings = useQuery(dayBookingsQuery(day));
  if (!benches.data || !bookings.data || benches.data.length === 0) return null;
  const sessions = bookings.data.filter((booking) => booking.kind === 'session' && isOn(booking, now));
  const people = new Set(sessions.map(({ personId }) => personId)).size;
  return (
    <section aria-labelledby="bench-row">
      <SectionHeading
        id="bench-row"
        end={
          people === 0
            ? 'Nobody at the benches'
            : `${capital(counted(people, 'person', 'people'))} at the benches`
        }
      >
        The bench row now
      </SectionHeading>
      <Box
        sx={{
          display: 'grid',
          gridAutoFlow: 'column',
          gridAutoColumns: { xs: '150px', md: 'minmax(0, 1fr)' },
          overflowX: 'auto',
        }}
      >
        {benches.data.map(({ id, tag }) => (
          <Bench
            key={id}
            tag={tag}
            at={sessions.filter(({ resources }) => resources.some((resource) => resource.id === id))}
          />
        ))}
      </Box>
    </section>
  );
}

function Bench({ tag, at }: { tag: string; at: readonly Booking[] }) {
  const isMine = at.some(({ mine }) => mine);
  const instruments = at.flatMap(({ resources }) => resources).filter(({ kind }) => kind === 'instrument');
  return (
    <Box
      sx={{
        p: '10px 12px 14px',
        borderRight: '1px solid',
        borderRightColor: 'token.rule',
        borderBottom: '4px solid',
        borderBottomColor: isMine ? 'token.green' : 'transparent',
        backgroundColor: isMine ? 'token.sheet' : 'transparent',
      }}
    >
      <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2', fontWeight: 600 }}>
        {tag}
      </Typography>
      <b>{isMine ? 'You' : (at[0]?.personName ?? 'Free')}</b>
      <Typography variant="small" component="p" sx={{ m: 0, mb: '6px' }}>
        {at[0] ? `until ${formatTime(at[0].endsAt)}` : ''}
      </Typography>
      {instruments.map((instrument) => (
        <AssetTag key={instrument.id}>{instrument.tag}</AssetTag>
      ))}
    </Box>
  );
}
