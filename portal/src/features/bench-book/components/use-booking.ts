import { useState } from 'react';
import { carryOut } from '../../../api-client/carry-out';
import { formatDay, formatSpan } from '../../../lib/club-time-text';
import { listText } from '../../../lib/text';
import { useToast } from '../../../shared-ui/toasts';
import { useBook, useCancelBooking, type Booking, type BookingWish, type FreeTime } from '../api/bench-book';
import { readRefusal, type Refusal } from '../form/refusal';

const bookedWords = ({ resources, startsAt, endsAt }: Booking): string =>
  `Booked ${listText(resources.map(({ tag }) => tag))}, ${formatDay(startsAt)} ${formatSpan(startsAt, endsAt)}.`;

/** Sends the form, tells of it with Undo, and keeps what was refused until the next try. */
export function useBooking(onBooked: (booking: Booking) => void) {
  const book = useBook();
  const cancel = useCancelBooking();
  const say = useToast();
  const [refusal, setRefusal] = useState<Refusal>();
  const send = (wish: BookingWish, instead?: FreeTime) => {
    const body = instead ? { ...wish, startsAt: instead.startsAt, endsAt: instead.endsAt } : wish;
    carryOut(book, body, {
      onSuccess: (booking) => {
        setRefusal(undefined);
        say(bookedWords(booking), () =>
          carryOut(cancel, booking.id, {
            onError: () => say('The booking still stands. It could not be undone.'),
          }),
        );
        onBooked(booking);
      },
      onError: (error) => setRefusal(readRefusal(error, body.resourceIds)),
    });
  };
  return {
    send,
    refusal,
    forget: () => setRefusal(undefined),
    isBusy: book.isPending,
    /** Not refused but failed: no connection, or the server. */
    failure: book.isError && !refusal ? book.error : undefined,
  };
}
