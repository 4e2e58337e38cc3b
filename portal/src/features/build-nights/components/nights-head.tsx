import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import IconButton from '@mui/material/IconButton';
import { clubDay, monthStart } from '../../../lib/club-time';
import { monthText } from '../../../lib/club-time-text';
import { Icon } from '../../../shared-ui/icon';
import { PageTitle } from '../../../shared-ui/page-title';
import { PhoneBar } from '../../../shared-ui/phone-bar';
import { token } from '../../../shared-ui/tokens';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import type { NightsPlace } from '../use-nights-place';

interface NightsHeadProps {
  place: NightsPlace;
  isMentor: boolean;
  isPhone: boolean;
}

const STEP = {
  border: `1px solid ${token('edge')}`,
  backgroundColor: token('sheet'),
  width: 44,
  '&:hover': { backgroundColor: token('sunk') },
};

/** Title, the way through the months, the other view, and for mentors the way to plan. */
export function NightsHead({ place, isMentor, isPhone }: NightsHeadProps) {
  const { month, view, planning } = place;
  const other = view === 'month' ? 'list' : 'month';
  const switchView = (
    <Button variant={isPhone ? 'text' : 'outlined'} onClick={() => place.show(other)}>
      {other === 'list' ? 'List' : 'Month'}
    </Button>
  );
  const ways = isMentor && !planning && <PlanButtons place={place} />;
  if (isPhone) {
    return (
      <>
        <PhoneBar title="Build nights" backTo="/" backLabel="Back to Tonight" end={switchView} />
        {view === 'month' ? (
          <PageTitle tab="Build nights" actions={<MonthSteps place={place} />}>
            <b>{monthText(month)}</b>
          </PageTitle>
        ) : (
          <VisuallyHidden>
            <h1>Build nights</h1>
          </VisuallyHidden>
        )}
        {ways && <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px', mb: '14px' }}>{ways}</Box>}
      </>
    );
  }
  return (
    <PageTitle
      tab="Build nights"
      actions={
        <>
          <MonthSteps place={place} />
          {switchView}
          {ways}
        </>
      }
    >
      Build nights, <b>{monthText(month)}</b>
    </PageTitle>
  );
}

function MonthSteps({ place }: { place: NightsPlace }) {
  const step = (months: number) => () => place.goTo(monthStart(place.month, months));
  return (
    <>
      <IconButton aria-label="Month before" sx={STEP} onClick={step(-1)}>
        <Icon name="back" size={16} />
      </IconButton>
      <Button onClick={() => place.goTo(monthStart(clubDay()))}>This month</Button>
      <IconButton aria-label="Month after" sx={STEP} onClick={step(1)}>
        <Icon name="forward" size={16} />
      </IconButton>
    </>
  );
}

function PlanButtons({ place }: { place: NightsPlace }) {
  return (
    <>
      <Button onClick={() => place.plan('night')}>Schedule a night</Button>
      <Button variant="contained" onClick={() => place.plan('series')}>
        Plan a series
      </Button>
    </>
  );
}
