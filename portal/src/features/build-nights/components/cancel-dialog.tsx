import Box from '@mui/material/Box';
import { carryOut } from '../../../api-client/carry-out';
import { formatDay } from '../../../lib/club-time-text';
import { counted } from '../../../lib/text';
import { ConfirmDialog } from '../../../shared-ui/confirm-dialog';
import { TextField } from '../../../shared-ui/fields/text-field';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import { useDraft } from '../../../shared-ui/use-draft';
import type { BuildNight } from '../api/nights';
import { useCancelNight } from '../api/nights';

interface CancelDialogProps {
  night: BuildNight;
  open: boolean;
  onClose: () => void;
}

/** Asks for a word before a night is cancelled, because it goes to everybody who was coming. */
export function CancelDialog({ night, open, onClose }: CancelDialogProps) {
  const say = useToast();
  const cancel = useCancelNight();
  const reason = useDraft(`build-night-cancel:${night.id}`, '');
  const day = formatDay(night.startsAt);
  const people = night.coming + night.waiting;
  const act = () =>
    carryOut(
      cancel,
      { id: night.id, reason: reason.value },
      {
        onSuccess: () => {
          reason.drop();
          onClose();
          say(`${day} is cancelled. Everybody who was coming is told by mail.`);
        },
      },
    );
  return (
    <ConfirmDialog
      open={open}
      title={`Cancel ${day}?`}
      act="Cancel the night"
      stay="Let it stand"
      grave
      isBusy={cancel.isPending}
      onAct={act}
      onStay={onClose}
    >
      {people === 0
        ? 'Nobody has said that they are coming. '
        : `${counted(people, 'person', 'people')} said that they are coming; each is told by mail. `}
      The benches are free again at once.
      <Box sx={{ mt: '10px' }}>
        <TextField
          label="Why, in a word to everybody"
          value={reason.value}
          onChange={reason.setValue}
          maxLength={300}
          rows={2}
          hint={reason.keptFrom}
        />
      </Box>
      {cancel.isError && (
        <Box sx={{ mt: '10px' }}>
          <ProblemAlert error={cancel.error} title="The night was not cancelled." />
        </Box>
      )}
    </ConfirmDialog>
  );
}
