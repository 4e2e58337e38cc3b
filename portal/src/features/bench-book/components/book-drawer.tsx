import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useEffect } from 'react';
import { useWatch, type UseFormReturn } from 'react-hook-form';
import { DockedDrawer } from '../../../shared-ui/docked-drawer';
import { useOnline } from '../../../shared-ui/use-online';
import { WaitingButton } from '../../../shared-ui/waiting-button';
import type { Bench, Booking, FreeTime } from '../api/bench-book';
import { useOpeningHours } from '../../../api-client/club';
import { StateMark } from '../../../shared-ui/states/shape';
import { longDayText } from '../../../lib/club-time-text';
import { usePhone } from '../../../shared-ui/use-phone';
import { closedWords, timesOf, wishOf, type BookingValues } from '../form/booking-values';
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
  const isPhone = usePhone();
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
      head={isPhone ? <SheetHead form={form} benches={rest.benches} /> : undefined}
      phone="beside"
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
  const closed = closedWords(values, useOpeningHours());
  const isPhone = usePhone();
  return (
    <Box sx={{ display: 'grid', gridTemplateColumns: { xs: '1fr', md: '1fr auto' }, gap: '8px' }}>
      {closed && <ClosedLine words={closed} />}
      {!isOnline ? (
        <WaitingButton fullWidth>Needs a connection</WaitingButton>
      ) : isNothing ? (
        <WaitingButton fullWidth>Book, nothing chosen yet</WaitingButton>
      ) : (
        <Button type="submit" form={FORM_ID} variant="contained" loading={isBusy}>
          {isTimed ? `Book ${values.from} to ${values.to}` : 'Book'}
        </Button>
      )}
      {!isPhone && <Button onClick={onClose}>Cancel</Button>}
    </Box>
  );
}

/** What the sheet is about, because its bench and day stand further down: 'Bench 3, Sat 17 October'. */
function SheetHead({ form, benches }: Pick<BookDrawerProps, 'form' | 'benches'>) {
  const [benchId, day] = useWatch({ control: form.control, name: ['benchId', 'day'] });
  const bench = benches.find(({ id }) => id === benchId)?.tag ?? 'No bench';
  return (
    <Typography variant="h2" sx={{ fontSize: '1.1875rem', lineHeight: '1.5rem' }}>
      {[bench, day && longDayText(day).replace(/^(\w{3})\w*/, '$1')].filter(Boolean).join(', ')}
    </Typography>
  );
}

/** No refusal: somebody with a key may be there. */
function ClosedLine({ words }: { words: string }) {
  return (
    <Box
      role="status"
      sx={{
        gridColumn: '1 / -1',
        display: 'flex',
        gap: '8px',
        typography: 'small',
        fontWeight: 600,
        color: 'token.brass',
      }}
    >
      <StateMark name="diamond" size={16} />
      {words}
    </Box>
  );
}
