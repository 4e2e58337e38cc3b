import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useEffect } from 'react';
import { useWatch, type UseFormReturn } from 'react-hook-form';
import { DockedDrawer } from '../../../shared-ui/docked-drawer';
import { useOnline } from '../../../shared-ui/use-online';
import { WaitingButton } from '../../../shared-ui/waiting-button';
import type { Bench, Booking, FreeTime } from '../api/bench-book';
import { timesOf, wishOf, type BookingValues } from '../form/booking-values';
import { BookForm } from './book-form';
import { useBooking } from './use-booking';

interface BookDrawerProps {
  open: boolean;
  form: UseFormReturn<BookingValues>;
  benches: readonly Bench[];
  laneIds: readonly string[];
  askedCheckId: string;
  keptFrom: string | undefined;
  onClose: () => void;
  onBooked: (booking: Booking) => void;
}

const FORM_ID = 'book-a-bench';

/** The form "Book a bench". Closing keeps what is typed; a lost race leaves it untouched. */
export function BookDrawer({ open, form, onClose, onBooked, keptFrom, ...rest }: BookDrawerProps) {
  const booking = useBooking(onBooked);
  const { setError, handleSubmit, getValues, reset } = form;
  const { refusal } = booking;
  useEffect(() => {
    for (const [field, message] of Object.entries(refusal?.fields ?? {}))
      setError(field as keyof BookingValues, { type: 'server', message });
  }, [refusal, setError]);
  const send = (values: BookingValues, instead?: FreeTime) => {
    const wish = wishOf(values);
    if (wish) booking.send(wish, instead);
  };
  const take = (time: FreeTime) => {
    const values = { ...getValues(), ...timesOf(time) };
    reset(values, { keepDefaultValues: true });
    send(values, time);
  };
  return (
    <DockedDrawer
      open={open}
      title="Book a bench"
      onClose={onClose}
      footer={<Footer form={form} isBusy={booking.isBusy} onClose={onClose} />}
    >
      <form id={FORM_ID} noValidate onSubmit={(event) => void handleSubmit((values) => send(values))(event)}>
        {keptFrom && (
          <Box sx={{ typography: 'small', color: 'token.ink2', mb: '8px' }} role="status">
            {keptFrom}
          </Box>
        )}
        <BookForm
          form={form}
          {...rest}
          refusal={refusal}
          failure={booking.failure}
          isBusy={booking.isBusy}
          onTake={take}
          onRetry={() => send(getValues())}
        />
      </form>
    </DockedDrawer>
  );
}

function Footer({ form, isBusy, onClose }: Pick<BookDrawerProps, 'form' | 'onClose'> & { isBusy: boolean }) {
  const isOnline = useOnline();
  const values = useWatch({ control: form.control, compute: (now) => ({ ...now }) });
  const isNothing = values.benchId === '' && values.instrumentIds.length === 0;
  const isTimed = wishOf(values) !== undefined;
  return (
    <Box sx={{ display: 'grid', gridTemplateColumns: '1fr auto', gap: '8px' }}>
      {!isOnline ? (
        <WaitingButton fullWidth>Needs a connection</WaitingButton>
      ) : isNothing ? (
        <WaitingButton fullWidth>Book, nothing chosen yet</WaitingButton>
      ) : (
        <Button type="submit" form={FORM_ID} variant="contained" loading={isBusy}>
          {isTimed ? `Book ${values.from} to ${values.to}` : 'Book'}
        </Button>
      )}
      <Button onClick={onClose}>Cancel</Button>
    </Box>
  );
}
