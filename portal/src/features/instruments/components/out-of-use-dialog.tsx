import { useQuery } from '@tanstack/react-query';
import { formatDay, formatSpan } from '../../../lib/club-time-text';
import { capital, counted } from '../../../lib/text';
import { ConfirmDialog } from '../../../shared-ui/confirm-dialog';
import { bookingsAheadQuery, type Instrument } from '../api/instruments';

/** How far ahead the book is looked through. */
const AHEAD_DAYS = 28;

interface OutOfUseDialogProps {
  instrument: Instrument;
  condition: Instrument['condition'];
  isBusy: boolean;
  onAct: () => void;
  onStay: () => void;
}

/** Asked before an instrument is taken out of everybody's hands: who had counted on it. */
export function OutOfUseDialog({ instrument, condition, isBusy, onAct, onStay }: OutOfUseDialogProps) {
  const ahead = useQuery(bookingsAheadQuery(instrument.id, AHEAD_DAYS));
  const bookings = ahead.data ?? [];
  return (
    <ConfirmDialog
      open
      title={`Put ${instrument.tag} ${condition}?`}
      act={`Put ${condition}`}
      stay="Leave it in use"
      grave
      isBusy={isBusy}
      onAct={onAct}
      onStay={onStay}
    >
      {ahead.data && `${capital(counted(bookings.length, 'booking'))} in the next four weeks. `}
      {bookings.length > 0 && 'They stay in the book; tell those who made them: '}
      {bookings
        .map(
          ({ personName, startsAt, endsAt }) =>
            `${personName}, ${formatDay(startsAt)}, ${formatSpan(startsAt, endsAt)}`,
        )
        .join('; ')}
      {bookings.length > 0 && '. '}
      Nobody can book it until it is ready again.
    </ConfirmDialog>
  );
}
