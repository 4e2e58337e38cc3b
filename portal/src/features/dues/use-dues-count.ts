import { useQuery } from '@tanstack/react-query';
import { clubDay } from '../../lib/club-time';
import { formatMoney } from '../../lib/money';
import { myInvoicesQuery } from './api/dues';
import { standingOf } from './standing';

/** For the rail: how many invoices are owed now, and their sum. */
export function useDuesCount(): { count?: number; news?: string } {
  const { data } = useQuery(myInvoicesQuery);
  const { owed, owedMinor } = standingOf(data ?? [], clubDay());
  return owed.length === 0 ? {} : { count: owed.length, news: `${formatMoney(owedMinor)} owed` };
}
