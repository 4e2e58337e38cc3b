import { useDuesCount } from '../features/dues/use-dues-count';
import { useTreasuryCount } from '../features/treasury/use-treasury-count';

/** What the rail and the More sheet say beside a page. */
export interface RailCount {
  /** Copper: so many things there need this person. */
  count?: number;
  /** A few words for the More sheet: 'Thu 22 Oct, coming'. */
  news?: string;
}

/**
 * Counts by path, put together here from the hooks of the features, since no feature may know another.
 * @example return { '/dues': useDuesCount(), '/review': useReviewCount() };
 */
export function useRailCounts(): Partial<Record<string, RailCount>> {
  return { '/dues': useDuesCount(), '/treasury': useTreasuryCount() };
}
