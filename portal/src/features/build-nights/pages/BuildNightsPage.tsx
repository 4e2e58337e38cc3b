import { useQuery } from '@tanstack/react-query';
import { useCallback, useState } from 'react';
import { useMe } from '../../../api-client/session';
import { addDays, clubDay, instantOf, monthStart, weekStart } from '../../../lib/club-time';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { usePhone } from '../../../shared-ui/use-phone';
import { nightsQuery } from '../api/nights';
import { ChangeDrawer } from '../components/change-drawer';
import { ListView } from '../components/list-view';
import { MonthView } from '../components/month-view';
import { NightsHead } from '../components/nights-head';
import { PlanDrawer } from '../components/plan-drawer';
import type { Entry } from '../night-view';
import { gridDays } from '../night-words';
import { useNightsPlace } from '../use-nights-place';

/** As many days as a list shows; the API gives at most 100 at a time. */
const LISTED_DAYS = 92;

export default function BuildNightsPage() {
  const me = useMe();
  const isPhone = usePhone();
  const place = useNightsPlace(isPhone);
  const [planned, setPlanned] = useState<Entry[]>([]);
  const { view, month } = place;
  const isMentor = me.hasRole('mentor');
  const query = useQuery(nightsQuery(...span(view, month)));
  const onPlanned = useCallback((entries: Entry[]) => setPlanned(entries), []);

  const open = { openId: place.nightId, onOpen: place.open, onChange: place.change };
  return (
    <>
      <NightsHead place={place} isMentor={isMentor} isPhone={isPhone} />
      {query.isPending && <LoadingBars rows={8} label="Loading build nights" />}
      {query.isError && <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />}
      {query.data && view === 'month' && (
        <MonthView
          {...open}
          month={month}
          nights={query.data}
          planned={planned}
          isPlanning={place.planning !== undefined}
          onDay={(day) => place.pickDay(day, query.data)}
          onMore={() => place.show('list')}
        />
      )}
      {query.data && view === 'list' && <ListView {...open} nights={query.data} isPhone={isPhone} />}
      {query.data?.length === 0 && (
        <EmptyState title="No nights planned">
          {isMentor ? 'Plan a series, or schedule a single night.' : 'Mentors plan them.'}
        </EmptyState>
      )}
      {isMentor && place.planning && (
        <PlanDrawer
          key={place.planning}
          kind={place.planning}
          day={place.plannedDay}
          onClose={place.closeDrawer}
          onPlanned={onPlanned}
          onScheduled={(first) => place.open(first.id, monthStart(clubDay(first.startsAt)))}
        />
      )}
      {isMentor && place.changingId && (
        <ChangeDrawer nightId={place.changingId} onClose={place.closeDrawer} />
      )}
    </>
  );
}

/** The instants between which nights are asked for: the month's grid, or a list from today on. */
function span(view: 'month' | 'list', month: string): [from: string, to: string] {
  if (view === 'month') {
    const { from, to } = gridDays(month, weekStart);
    return [instantOf(from, 0), instantOf(to, 0)];
  }
  const today = clubDay();
  const from = month === monthStart(today) ? today : month;
  return [instantOf(from, 0), instantOf(addDays(from, LISTED_DAYS), 0)];
}
