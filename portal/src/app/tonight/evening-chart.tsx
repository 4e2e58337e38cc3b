import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { minutesBetween, wallOf, type Instant } from '../../lib/club-time';
import { clockText, formatTime } from '../../lib/club-time-text';
import type { Booking } from '../../features/bench-book/api/bench-book';

interface EveningChartProps {
  bookings: readonly Booking[];
  startsAt: Instant;
  endsAt: Instant;
  now: Date;
}

const ROW = 38;

/** One's evening on quarter-hours: a row for each bench and instrument, the now line in copper. */
export function EveningChart({ bookings, startsAt, endsAt, now }: EveningChartProps) {
  const length = minutesBetween(startsAt, endsAt);
  const at = (instant: Instant): number =>
    Math.min(100, Math.max(0, (minutesBetween(startsAt, instant) / length) * 100));
  const first = wallOf(startsAt).minute;
  const halves = Array.from({ length: Math.floor(length / 30) + 1 }, (_, index) => index * 30);
  const quarters = Array.from({ length: Math.floor(length / 15) + 1 }, (_, index) => index * 15);
  const rows = bookings.flatMap((booking) => booking.resources.map((resource) => ({ booking, resource })));
  const isOn = minutesBetween(startsAt, now) >= 0 && minutesBetween(now, endsAt) >= 0;
  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '84px minmax(0, 1fr)', md: '120px minmax(0, 1fr)' },
        pt: '4px',
      }}
    >
      <span />
      <Box aria-hidden sx={{ position: 'relative', height: 22 }}>
        {halves.map((minute) => (
          <Typography
            key={minute}
            variant="least"
            component="span"
            sx={{
              position: 'absolute',
              left: `${(minute / length) * 100}%`,
              fontWeight: minute % 60 === 0 ? 700 : 400,
            }}
          >
            {clockText(first + minute)}
          </Typography>
        ))}
      </Box>
      {rows.map(({ booking, resource }) => (
        <Lane
          key={booking.id + resource.id}
          {...{ booking, resource, quarters }}
          from={at(booking.startsAt)}
          to={at(booking.endsAt)}
          now={isOn ? at(now) : undefined}
          share={(minute) => (minute / length) * 100}
        />
      ))}
    </Box>
  );
}

interface LaneProps {
  booking: Booking;
  resource: Booking['resources'][number];
  /** Minutes after the beginning at which a hairline stands. */
  quarters: readonly number[];
  share: (minute: number) => number;
  /** Per cent of the lane's width. */
  from: number;
  to: number;
  now?: number;
}

function Lane({ booking, resource, quarters, share, from, to, now }: LaneProps) {
  const isBench = resource.kind === 'bench';
  const line = { position: 'absolute', top: 0, bottom: 0 };
  return (
    <Box sx={{ display: 'contents' }}>
      <Typography
        variant="small"
        component="span"
        sx={{
          display: 'flex',
          alignItems: 'center',
          fontWeight: 600,
          borderTop: '1px solid',
          borderColor: 'token.rule',
        }}
      >
        {resource.tag}
      </Typography>
      <Box sx={{ position: 'relative', height: ROW, borderTop: '1px solid', borderColor: 'token.rule' }}>
        {quarters.map((minute) => (
          <Box
            key={minute}
            aria-hidden
            sx={{ ...line, left: `${share(minute)}%`, borderLeft: '1px solid', borderColor: 'token.rule' }}
          />
        ))}
        <Box
          sx={{
            position: 'absolute',
            top: 5,
            height: ROW - 11,
            left: `${from}%`,
            width: `${to - from}%`,
            display: 'flex',
            alignItems: 'center',
            px: '8px',
            overflow: 'hidden',
            whiteSpace: 'nowrap',
            fontSize: '0.78125rem',
            fontWeight: 600,
            border: '1px solid',
            borderColor: 'token.green',
            borderRadius: '2px',
            backgroundColor: isBench ? 'token.greenTint' : 'token.green',
            color: isBench ? 'token.ink' : 'token.onGreen',
          }}
        >
          {isBench ? `Yours until ${formatTime(booking.endsAt)}` : resource.name}
        </Box>
        {now !== undefined && (
          <Box
            aria-hidden
            sx={{ ...line, left: `${now}%`, borderLeft: '2px solid', borderColor: 'token.copper' }}
          />
        )}
      </Box>
    </Box>
  );
}
