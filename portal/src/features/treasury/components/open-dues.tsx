import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { dayText } from '../../../lib/club-time-text';
import { formatAmount, formatMoney } from '../../../lib/money';
import { AssetTag } from '../../../shared-ui/asset-tag';
import { DataTable } from '../../../shared-ui/data-table';
import type { Column } from '../../../shared-ui/data-table-types';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { openDuesQuery, type OpenInvoice } from '../api/treasury';
import { FilterWords } from '../../../shared-ui/filter-words';

interface OpenDuesProps {
  currency: string;
  onTake: (invoice: OpenInvoice) => void;
}

const lateWords = ({ daysLate, state }: OpenInvoice): string =>
  daysLate > 0 ? `${daysLate} days late` : state === 'part paid' ? 'part paid' : '';

const columnsFor = (onTake: (invoice: OpenInvoice) => void): Column<OpenInvoice>[] => [
  { key: 'who', header: 'Who', cell: ({ personName }) => personName },
  { key: 'invoice', header: 'Invoice', cell: ({ number }) => <AssetTag>{number}</AssetTag>, width: 92 },
  { key: 'for', header: 'For', cell: ({ description }) => description },
  { key: 'due', header: 'Due', cell: ({ dueOn }) => dayText(dueOn), width: 104 },
  {
    key: 'late',
    header: '',
    cell: (invoice) => (
      <Box
        component="span"
        sx={{ color: invoice.daysLate > 60 ? 'token.oxide' : 'token.ink2', fontWeight: 600 }}
      >
        {lateWords(invoice)}
      </Box>
    ),
    width: 112,
  },
  {
    key: 'open',
    header: 'Open',
    cell: ({ openMinor }) => <b>{formatAmount(openMinor)}</b>,
    align: 'right',
    width: 84,
    phone: 'end',
  },
  {
    key: 'take',
    header: '',
    cell: (invoice) => (
      <Button
        size="small"
        aria-label={`Take a payment for ${invoice.number}`}
        onClick={() => onTake(invoice)}
      >
        Take
      </Button>
    ),
    align: 'right',
    width: 92,
    phone: 'act',
  },
];

/** Everything left to pay, those due first first; the filter and the page stand in the address. */
export function OpenDues({ currency, onTake }: OpenDuesProps) {
  const [search, setSearch] = useSearchParams();
  const state = search.get('dues') === 'late' ? 'late' : 'open';
  const page = Math.max(Number(search.get('page')) || 1, 1);
  const query = useQuery(openDuesQuery(page, state));
  const go = (dues: 'open' | 'late', next: number) =>
    setSearch(
      { ...(dues === 'late' && { dues }), ...(next > 1 && { page: String(next) }) },
      { preventScrollReset: true },
    );
  const { items = [], total = 0, openMinor = 0, perPage = 1 } = query.data ?? {};
  return (
    <Box component="section" aria-labelledby="open-dues">
      <SectionHeading id="open-dues" end={query.data && `${total} open, ${formatMoney(openMinor, currency)}`}>
        Open dues
      </SectionHeading>
      <FilterWords
        label="Which dues"
        value={state}
        options={[
          { value: 'open', words: 'All open' },
          { value: 'late', words: 'Late' },
        ]}
        onChange={(next) => go(next, 1)}
      />
      {query.isPending && <LoadingBars rows={6} label="Loading open dues" />}
      {query.isError && <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />}
      {query.data && items.length === 0 && (
        <EmptyState title={state === 'late' ? 'Nothing is late' : 'Nothing is open'}>
          {state === 'late'
            ? 'Everything open is still within its day.'
            : 'Every invoice that was raised is paid.'}
        </EmptyState>
      )}
      {items.length > 0 && (
        <DataTable label="Open dues" columns={columnsFor(onTake)} rows={items} rowKey={({ id }) => id} />
      )}
      {total > perPage && (
        <Box sx={{ display: 'flex', alignItems: 'center', gap: '12px', mt: '12px', typography: 'small' }}>
          <Button size="small" disabled={page === 1} onClick={() => go(state, page - 1)}>
            Before
          </Button>
          Page {page} of {Math.ceil(total / perPage)}
          <Button size="small" disabled={page * perPage >= total} onClick={() => go(state, page + 1)}>
            Next
          </Button>
        </Box>
      )}
    </Box>
  );
}
