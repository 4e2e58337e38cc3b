import Box from '@mui/material/Box';
import { formatTime } from '../../../lib/club-time-text';
import type { UseQueryResult } from '@tanstack/react-query';
import type { Control } from 'react-hook-form';
import { Banner } from '../../../shared-ui/banner';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { usePhone } from '../../../shared-ui/use-phone';
import type { Booking } from '../api/bench-book';
import type { BookView } from '../book-view';
import { useOpeningHours } from '../../../api-client/club';
import type { BookingValues } from '../form/booking-values';
import type { Lane } from '../lanes/lane';
import { BookingList } from './booking-list';
import type { Picked } from './lane-day';
import { useWishes } from './use-wishes';
import { WeekLanes } from './week-lanes';

interface BookWeekProps {
  view: BookView;
  dates: readonly string[];
  lanes: readonly Lane[];
  bookings: UseQueryResult<Booking[]>;
  control: Control<BookingValues>;
  isFormOpen: boolean;
  openId: string | undefined;
  onPick: (picked: Picked) => void;
  onOpen: (booking: Booking) => void;
  onBook: () => void;
}

/** The week as lanes or as a list, whatever state its bookings are in. */
export function BookWeek(props: BookWeekProps) {
  const { view, dates, lanes, bookings, control, isFormOpen, openId, onPick, onOpen, onBook } = props;
  const wishes = useWishes(control, isFormOpen);
  const isPhone = usePhone();
  const hours = useOpeningHours();
  if (bookings.isPending) return <LoadingBars rows={8} label="Loading bookings" />;
  if (!bookings.data) return <ProblemAlert error={bookings.error} onRetry={() => void bookings.refetch()} />;
  return (
    <>
      {bookings.isError && (
        <Box sx={{ mb: '10px' }}>
          <Banner kind="no connection" title={`As of ${formatTime(new Date(bookings.dataUpdatedAt))}.`}>
            The book could not be asked again. What was last known stays here.
          </Banner>
        </Box>
      )}
      {view.kind === 'list' ? (
        <BookingList bookings={bookings.data} openId={openId} onOpen={onOpen} onBook={onBook} />
      ) : (
        <WeekLanes
          dates={isPhone ? [view.day] : dates}
          lanes={lanes}
          bookings={bookings.data}
          wishes={wishes}
          hours={hours}
          week={dates}
          hasDays={!isPhone}
          isUnderSheet={isPhone && isFormOpen}
          onPick={onPick}
          onOpen={onOpen}
        />
      )}
    </>
  );
}
