import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useState } from 'react';
import { minutesBetween } from '../../../lib/club-time';
import { formatDay, formatInClubZone, formatSpan, lengthText } from '../../../lib/club-time-text';
import { AssetTag } from '../../../shared-ui/asset-tag';
import { ConfirmDialog } from '../../../shared-ui/confirm-dialog';
import { DockedDrawer } from '../../../shared-ui/docked-drawer';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import type { Booking } from '../api/bench-book';
import { useCancelling } from './use-cancelling';

/** One booking: who, when, what; and cancelling, for those who may. */
export function BookingDrawer({ booking, onClose }: { booking: Booking; onClose: () => void }) {
  const { cancel, isBusy, error } = useCancelling(onClose);
  const [isAsking, setIsAsking] = useState(false);
  const { startsAt, endsAt, mine, personName, groupName, mayCancel } = booking;
  const isNight = booking.kind === 'build night';
  const title = isNight ? booking.title : mine ? 'Your booking' : personName;
  const [now] = useState(() => Date.now());
  const isRunning = Date.parse(startsAt) <= now;
  const act = isRunning ? 'End it now' : 'Cancel the booking';
  const span = `${formatDay(startsAt)}, ${formatSpan(startsAt, endsAt)}`;
  return (
    <DockedDrawer
      open
      title={title}
      onClose={onClose}
      footer={
        mayCancel && (
          <Button color="error" loading={isBusy} onClick={() => (mine ? cancel(booking) : setIsAsking(true))}>
            {act}
          </Button>
        )
      }
    >
      <Box component="p" sx={{ m: 0, fontWeight: 700 }}>
        {span}
      </Box>
      <Box sx={LINE}>{lengthText(minutesBetween(startsAt, endsAt))}</Box>
      <Box component="ul" sx={{ listStyle: 'none', p: 0, m: '14px 0', display: 'grid', gap: '8px' }}>
        {booking.resources.map(({ id, tag, name }) => (
          <li key={id}>
            <AssetTag>{tag}</AssetTag> {name}
          </li>
        ))}
      </Box>
      {groupName && <Box sx={LINE}>With {groupName}</Box>}
      <Box sx={LINE}>
        {isNight ? `Held by ${personName}` : 'Booked'} {formatInClubZone(booking.madeAt)}
      </Box>
      {isNight && <Box sx={LINE}>What is held for a build night is changed under Build nights.</Box>}
      {error !== null && <ProblemAlert error={error} title="It was not cancelled." />}
      <ConfirmDialog
        open={isAsking}
        title={`${act}?`}
        act={act}
        stay="Leave it booked"
        grave
        isBusy={isBusy}
        onAct={() => cancel(booking)}
        onStay={() => setIsAsking(false)}
      >
        {personName} has {span}. {personName} is told by mail that you cancelled it.
      </ConfirmDialog>
    </DockedDrawer>
  );
}

const LINE = { typography: 'small', color: 'token.ink2', mt: '4px' } as const;
