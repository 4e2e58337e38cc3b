import { useQuery } from '@tanstack/react-query';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { BuildNight } from '../../features/build-nights/api/nights';
import { clubDay } from '../../lib/club-time';
import { formatSpan, longDayText } from '../../lib/club-time-text';
import { listText } from '../../lib/text';
import { PageTitle } from '../../shared-ui/page-title';
import { BenchRow } from './bench-row';
import { BeforeYouSwitchOn, BuildStrip } from './build-strip';
import { ComingUp } from './coming-up';
import { comingNightsQuery, dayBookingsQuery, nightsAround } from './evening';
import { NeedsYou } from './needs-you';
import { NextStep } from './next-step';
import { useNow } from './use-now';
import { YourEvening } from './your-evening';

/** What do I do next, where, and with what? Put together from every feature, since none of them may know another. */
export default function TonightPage() {
  const now = useNow();
  const day = clubDay(now);
  const nights = useQuery(comingNightsQuery(day));
  const bookings = useQuery(dayBookingsQuery(day));
  const { tonight } = nightsAround(nights.data ?? [], day);
  const bench = (bookings.data ?? [])
    .filter(({ mine, kind }) => mine && kind === 'session')
    .flatMap(({ resources }) => resources)
    .find(({ kind }) => kind === 'bench')?.tag;
  return (
    <>
      <PageTitle tab="Tonight" over={overText(tonight)} actions={tonight && <NightLine night={tonight} />}>
        {longDayText(day)}
      </PageTitle>
      <Box
        sx={{
          display: 'grid',
          gridTemplateColumns: { xs: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 356px' },
          gap: '24px 40px',
          alignItems: 'start',
        }}
      >
        <Box sx={{ display: 'grid', gap: '24px', minWidth: 0 }}>
          <NextStep bench={bench} />
          <YourEvening day={day} now={now} />
        </Box>
        <Box sx={{ display: 'grid', gap: '28px' }}>
          <NeedsYou />
          <BeforeYouSwitchOn />
        </Box>
      </Box>
      <Box sx={{ display: 'grid', gridTemplateColumns: 'minmax(0, 1fr)', gap: '28px', mt: '28px' }}>
        <BuildStrip />
        <BenchRow day={day} now={now} />
        <ComingUp day={day} />
      </Box>
    </>
  );
}

function overText(night: BuildNight | undefined): string {
  if (!night) return 'No build night tonight';
  const { series, title } = night;
  return series ? `${series.title}, night ${series.number} of ${series.total}` : title;
}

function NightLine({ night }: { night: BuildNight }) {
  const { startsAt, endsAt, mentors } = night;
  const names = listText(mentors.map(({ name }) => name));
  return (
    <Box sx={{ textAlign: { md: 'right' } }}>
      <Typography component="p" sx={{ m: 0, fontWeight: 700 }}>
        Build night, {formatSpan(startsAt, endsAt)}
      </Typography>
      {names && (
        <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
          {names} mentoring
        </Typography>
      )}
    </Box>
  );
}
