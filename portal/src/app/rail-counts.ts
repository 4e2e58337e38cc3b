import { useMe } from '../api-client/session';
import { useMyBuildSummaries } from '../features/builds/api/builds';
import { useReviews } from '../features/builds/api/reviews';
import { useDuesCount } from '../features/dues/use-dues-count';
import { useTreasuryCount } from '../features/treasury/use-treasury-count';

/** What the rail and the More sheet say beside a page. */
export interface RailCount {
  /** Copper: so many things there need this person. */
  count?: number;
  /** A few words for the More sheet: 'Thu 22 Oct, coming'. */
  news?: string;
}

/** Counts by path, put together here from the hooks of the features, since no feature may know another. */
export function useRailCounts(): Partial<Record<string, RailCount>> {
  const me = useMe();
  const builds = useMyBuildSummaries();
  const dues = useDuesCount();
  const treasury = useTreasuryCount();
  const reviews = useReviews(me.hasRole('mentor'));
  const back = (builds.data ?? [])
    .flatMap(({ stages }) => stages)
    .filter(({ state }) => state === 'sent back').length;
  const waiting = (reviews.data?.items ?? []).filter(({ isOwn }) => !isOwn).length;
  return {
    '/dues': dues,
    '/treasury': treasury,
    ...(back > 0 && { '/build': { count: back, news: 'Sent back' } }),
    ...(waiting > 0 && { '/review': { count: waiting, news: `${waiting} waiting` } }),
  };
}
