import { carryOut } from '../../../api-client/carry-out';
import { formatDay, formatSpan } from '../../../lib/club-time-text';
import { useToast } from '../../../shared-ui/toasts';
import { useBook, useCancelBooking, type Booking } from '../api/bench-book';

/** Cancels a booking and offers to book one's own again. */
export function useCancelling(onDone: () => void) {
  const cancelling = useCancelBooking();
  const book = useBook();
  const say = useToast();
  const again = ({ resources, startsAt, endsAt, groupId, checkId }: Booking) =>
    carryOut(
      book,
      {
        resourceIds: resources.map(({ id }) => id),
        ...{ startsAt, endsAt },
        ...(groupId && { groupId }),
        ...(checkId && { checkId }),
      },
      {
        onSuccess: () => say('The booking stands again.'),
        onError: () => say('Not booked again: somebody has it by now, or the time is past.'),
      },
    );
  const cancel = (booking: Booking) =>
    carryOut(cancelling, booking.id, {
      onSuccess: () => {
        const isAhead = Date.parse(booking.startsAt) > Date.now();
        const words = `Cancelled ${formatDay(booking.startsAt)}, ${formatSpan(booking.startsAt, booking.endsAt)}.`;
        say(words, booking.mine && isAhead ? () => again(booking) : undefined);
        onDone();
      },
    });
  return { cancel, isBusy: cancelling.isPending, error: cancelling.error };
}
