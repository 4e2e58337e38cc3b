import { useQuery } from '@tanstack/react-query';
import { useMe } from '../../api-client/session';
import { statementsQuery } from './api/treasury';

/** For the rail: how many lines of statements nobody has settled; asked for treasurers only. */
export function useTreasuryCount(): { count?: number; news?: string } {
  const isTreasurer = useMe().hasRole('treasurer');
  const { data } = useQuery({ ...statementsQuery, enabled: isTreasurer });
  const count = (data?.items ?? []).reduce((sum, one) => sum + one.lineCount - one.matchedCount, 0);
  return count === 0 ? {} : { count, news: `${count} lines unmatched` };
}
