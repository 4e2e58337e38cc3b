import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { minutesBetween } from '../../../lib/club-time';
import { formatDay, formatSpan, lengthText } from '../../../lib/club-time-text';
import { counted } from '../../../lib/text';
import { AssetTag } from '../../../shared-ui/asset-tag';
import { DataTable } from '../../../shared-ui/data-table';
import type { Column } from '../../../shared-ui/data-table-types';
import { EmptyState } from '../../../shared-ui/empty-state';
import type { Booking } from '../api/bench-book';

interface BookingListProps {
  bookings: readonly Booking[];
  openId: string | undefined;
  onOpen: (booking: Booking) => void;
  onBook: () => void;
}

const who = ({ kind, title, mine, personName }: Booking): string =>
  kind === 'build night' ? title : mine ? 'You' : personName;

const COLUMNS: readonly Column<Booking>[] = [
  {
    key: 'when',
    header: 'When',
    width: 250,
    cell: ({ startsAt, endsAt }) => `${formatDay(startsAt)}, ${formatSpan(startsAt, endsAt)}`,
  },
  { key: 'who', header: 'Who', cell: who, phone: 'second' },
  {
    key: 'what',
    header: 'What',
    cell: ({ resources }) => (
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '4px 8px' }}>
        {resources.map(({ id, kind, tag }) =>
          kind === 'bench' ? <span key={id}>{tag}</span> : <AssetTag key={id}>{tag}</AssetTag>,
        )}
      </Box>
    ),
  },
  { key: 'group', header: 'Group', cell: ({ groupName }) => groupName ?? '', phone: 'hidden' },
  {
    key: 'length',
    header: 'Length',
    align: 'right',
    cell: ({ startsAt, endsAt }) => lengthText(minutesBetween(startsAt, endsAt)),
    phone: 'end',
  },
];

/** The same week as rows: every bench and instrument, in the order of time. */
export function BookingList({ bookings, openId, onOpen, onBook }: BookingListProps) {
  if (bookings.length === 0)
    return (
      <EmptyState
        title="An open week"
        action={
          <Button variant="contained" onClick={onBook}>
            Book a bench
          </Button>
        }
      >
        Nothing is booked yet. Pick a time to book it.
      </EmptyState>
    );
  const mine = bookings.filter((booking) => booking.mine).length;
  return (
    <DataTable
      label="Bookings of the week"
      columns={COLUMNS}
      rows={bookings}
      rowKey={({ id }) => id}
      openKey={openId}
      onOpen={onOpen}
      footer={`${bookings.length} bookings this week, ${counted(mine, 'is', 'are')} yours`.replace(
        'no are',
        'none',
      )}
    />
  );
}
