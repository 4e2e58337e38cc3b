import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { useMemo, useState, type KeyboardEvent } from 'react';
import { clubDay } from '../../../lib/club-time';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { usePhone } from '../../../shared-ui/use-phone';
import {
  benchesQuery,
  bookingsQuery,
  instrumentsQuery,
  type Bench,
  type Booking,
  type Instrument,
} from '../api/bench-book';
import { useBookView, type BookView } from '../book-view';
import { BookBar } from '../components/book-bar';
import { BookDrawer } from '../components/book-drawer';
import { BookHeader } from '../components/book-header';
import { BookWeek } from '../components/book-week';
import { BookingDrawer } from '../components/booking-drawer';
import { DayStrip } from '../components/day-strip';
import { PhoneBookBar } from '../components/phone-book-bar';
import { useBookForm } from '../components/use-book-form';
import { benchLane, instrumentLane, lanesShown } from '../lanes/lane';
import { daysFrom } from '../lanes/segments';

const TYPING = 'input, textarea, select, [role="combobox"], [role="dialog"], [role="menu"]';

export default function BenchBookPage() {
  const view = useBookView();
  const benches = useQuery(benchesQuery);
  const instruments = useQuery(instrumentsQuery(clubDay()));
  const failed = [benches, instruments].find(({ isError, data }) => isError && !data);
  if (failed) return <ProblemAlert error={failed.error} onRetry={() => void failed.refetch()} />;
  if (!benches.data || !instruments.data) return <LoadingBars rows={10} label="Loading the bench book" />;
  return <BenchBook view={view} benches={benches.data} instruments={instruments.data} />;
}

interface BenchBookProps {
  view: BookView;
  benches: Bench[];
  instruments: Instrument[];
}

function BenchBook({ view, benches, instruments }: BenchBookProps) {
  const isPhone = usePhone();
  const dates = daysFrom(view.week, 7);
  const all = useMemo(
    () => [...benches.map(benchLane), ...instruments.map(instrumentLane)],
    [benches, instruments],
  );
  const lanes = useMemo(() => lanesShown(all, view.tags), [all, view.tags]);
  const bookings = useQuery(bookingsQuery(view.week, 7));
  const book = useBookForm(view, benches, instruments);
  const [opened, setOpened] = useState<Booking>();

  const openForm = () => {
    setOpened(undefined);
    book.open();
  };
  const openBooking = (booking: Booking) => {
    book.close();
    setOpened(booking);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    const isTyping = event.target instanceof Element && event.target.closest(TYPING) !== null;
    if (event.key.toLowerCase() !== 'n' || event.defaultPrevented || isTyping) return;
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    openForm();
  };
  const isEmpty = bookings.data?.length === 0;
  return (
    <Box onKeyDown={onKeyDown}>
      {isPhone ? (
        <>
          <PhoneBookBar view={view} all={all} shown={lanes} onBook={book.isOpen ? undefined : openForm} />
          <DayStrip dates={dates} day={view.day} onDay={book.showDay} />
        </>
      ) : (
        <>
          <BookHeader
            week={view.week}
            day={view.day}
            onDay={view.showDay}
            onBook={book.isOpen ? undefined : openForm}
          />
          <BookBar view={view} all={all} shown={lanes} isEmpty={isEmpty} />
        </>
      )}
      <BookWeek
        view={view}
        dates={dates}
        lanes={lanes}
        bookings={bookings}
        control={book.form.control}
        isFormOpen={book.isOpen}
        openId={opened?.id}
        onPick={(picked) => {
          setOpened(undefined);
          book.pick(picked);
        }}
        onOpen={openBooking}
        onBook={openForm}
      />
      <BookDrawer
        open={book.isOpen}
        form={book.form}
        benches={benches}
        laneIds={lanes.map(({ id }) => id)}
        askedCheckId={view.check}
        keptFrom={book.keptFrom}
        onClose={book.close}
        onBooked={book.finish}
      />
      {opened && <BookingDrawer key={opened.id} booking={opened} onClose={() => setOpened(undefined)} />}
    </Box>
  );
}
