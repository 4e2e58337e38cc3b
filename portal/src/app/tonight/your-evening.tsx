import { useQuery } from '@tanstack/react-query';
import Button from '@mui/material/Button';
import { Link } from 'react-router-dom';
import { formatInClubZone } from '../../lib/club-time-text';
import { EmptyState } from '../../shared-ui/empty-state';
import { LoadingBars } from '../../shared-ui/loading-bars';
import { ProblemAlert } from '../../shared-ui/problem-alert';
import { SectionHeading } from '../../shared-ui/section-heading';
import { comingNightsQuery, dayBookingsQuery, nightsAround } from './evening';
import { EveningChart } from './evening-chart';

/** What one has tonight, on quarter-hours; where there is nothing, when the next night is. */
export function YourEvening({ day, now }: { day: string; now: Date }) {
  const bookings = useQuery(dayBookingsQuery(day));
  const nights = useQuery(comingNightsQuery(day));
  const failed = [bookings, nights].find(({ isError }) => isError);
  const { tonight, next } = nightsAround(nights.data ?? [], day);
  const mine = (bookings.data ?? []).filter(({ mine: isMine, kind }) => isMine && kind === 'session');
  const starts = [tonight?.startsAt, ...mine.map(({ startsAt }) => startsAt)]
    .filter((at) => at !== undefined)
    .sort();
  const ends = [tonight?.endsAt, ...mine.map(({ endsAt }) => endsAt)].filter((at) => at !== undefined).sort();
  const [startsAt, endsAt] = [starts[0], ends.at(-1)];
  return (
    <section aria-labelledby="evening">
      <SectionHeading id="evening">Your evening</SectionHeading>
      {(bookings.isPending || nights.isPending) && <LoadingBars rows={3} label="Looking for your evening" />}
      {failed && (
        <ProblemAlert
          error={failed.error}
          onRetry={() => {
            void bookings.refetch();
            void nights.refetch();
          }}
        />
      )}
      {mine.length > 0 && startsAt && endsAt && (
        <EveningChart bookings={mine} {...{ startsAt, endsAt, now }} />
      )}
      {bookings.isSuccess && nights.isSuccess && mine.length === 0 && (
        <EmptyState
          title={tonight ? 'Nothing booked for you tonight' : 'No build night tonight'}
          action={
            <Button component={Link} to="/bench-book">
              Book a bench
            </Button>
          }
        >
          {!tonight && next && `The next one is ${next.title}, ${formatInClubZone(next.startsAt)}.`}
          {!tonight && !next && 'No night is planned yet.'}
        </EmptyState>
      )}
    </section>
  );
}
