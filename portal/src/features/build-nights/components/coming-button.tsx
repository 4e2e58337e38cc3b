import Button from '@mui/material/Button';
import { carryOut } from '../../../api-client/carry-out';
import { formatDay } from '../../../lib/club-time-text';
import { useToast } from '../../../shared-ui/toasts';
import type { BuildNight, NightDetail } from '../api/nights';
import { useComing } from '../api/nights';
import { lineWords } from '../night-words';

interface ComingButtonProps {
  night: BuildNight;
  /** In a row the button is short: "Say coming". */
  short?: boolean;
  onError: (error: unknown) => void;
}

/** Says coming, joins the waiting list, or takes either back; it names what will happen. */
export function ComingButton({ night, short = false, onError }: ComingButtonProps) {
  const say = useToast();
  const coming = useComing();
  if (night.cancelledAt || night.mine?.state === 'on duty' || new Date(night.endsAt) <= new Date())
    return null;
  const isFull = night.coming >= night.places;
  const isComing = night.mine === null;
  const words = isComing ? joinWords(isFull, short) : leaveWords(night.mine?.state);
  const send = () =>
    carryOut(
      coming,
      { id: night.id, isComing },
      {
        onSuccess: (after) => say(outcomeWords(after, isFull, isComing)),
        onError,
      },
    );
  return (
    <Button
      variant={isComing && !short && !isFull ? 'contained' : 'outlined'}
      loading={coming.isPending}
      aria-label={short ? `${words}, ${formatDay(night.startsAt)}` : undefined}
      onClick={send}
    >
      {words}
    </Button>
  );
}

function joinWords(isFull: boolean, short: boolean): string {
  if (isFull) return short ? 'Wait for a place' : 'Full, wait for a place';
  return short ? 'Say coming' : 'I am coming';
}

const leaveWords = (state: string | undefined): string =>
  state === 'waiting' ? 'Leave the waiting list' : 'I cannot come';

/** What came of it, and not what was hoped for: the last place may have gone meanwhile. */
function outcomeWords(night: NightDetail, wasFull: boolean, isComing: boolean): string {
  const day = formatDay(night.startsAt);
  if (!isComing) return `You are not coming on ${day}.`;
  if (night.mine?.state !== 'waiting') return `You are coming on ${day}.`;
  const line = `You are ${lineWords(night.mine.line ?? 1)} for ${day}.`;
  return wasFull ? line : `It filled a moment before. ${line}`;
}
