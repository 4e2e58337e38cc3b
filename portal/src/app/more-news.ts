import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { nightsQuery, type BuildNight } from '../features/build-nights/api/nights';
import { groupsQuery } from '../features/groups/api/groups';
import { instrumentListQuery } from '../features/instruments/api/instruments';
import { addDays, clubDay, instantOf } from '../lib/club-time';
import { formatDay } from '../lib/club-time-text';
import { countWord } from '../lib/text';

/** As far ahead as the news of build nights look. */
const NIGHTS_AHEAD_DAYS = 60;

function nightNews(nights: readonly BuildNight[], now: Date): string | undefined {
  const next = nights.find(({ cancelledAt, endsAt }) => cancelledAt === null && new Date(endsAt) > now);
  if (!next) return undefined;
  const day = formatDay(next.startsAt);
  return next.mine ? `${day}, ${next.mine.state}` : day;
}

function instrumentNews(instruments: readonly { condition: string }[]): string {
  const out = instruments.filter(({ condition }) => condition !== 'ready').length;
  return out === 0
    ? `${instruments.length}, all ready`
    : `${instruments.length}, ${countWord(out)} not ready`;
}

/** What the More sheet says beside pages that need nobody, by path; asked for when the sheet is open. */
export function useMoreNews(isOpen: boolean): Partial<Record<string, string>> {
  const [today] = useState(() => clubDay());
  const nights = useQuery({
    ...nightsQuery(instantOf(today, 0), instantOf(addDays(today, NIGHTS_AHEAD_DAYS), 0)),
    enabled: isOpen,
  });
  const groups = useQuery({ ...groupsQuery, enabled: isOpen });
  const instruments = useQuery({ ...instrumentListQuery, enabled: isOpen });
  const own = groups.data?.find(({ mine }) => mine);
  return {
    '/build-nights': nights.data && nightNews(nights.data, new Date()),
    '/groups': own?.name,
    '/instruments': instruments.data && instrumentNews(instruments.data),
  };
}
