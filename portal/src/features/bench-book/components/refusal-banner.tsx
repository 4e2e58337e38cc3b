import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { formatDay, formatSpan } from '../../../lib/club-time-text';
import { Banner } from '../../../shared-ui/banner';
import type { FreeTime } from '../api/bench-book';
import type { Refusal } from '../form/refusal';

interface RefusalBannerProps {
  refusal: Refusal;
  isBusy: boolean;
  /** Books that time, everything else as typed. */
  onTake: (time: FreeTime) => void;
}

/** Who has it, that nothing is lost, and the nearest times at which all of it is free: one press each. */
export function RefusalBanner({ refusal, isBusy, onTake }: RefusalBannerProps) {
  const { detail, nearestFree } = refusal;
  if (!detail) return null;
  const buttons = nearestFree.length > 0 && (
    <Box role="group" aria-label="Nearest free times" sx={{ display: 'grid', gap: '8px' }}>
      {nearestFree.map((time) => (
        <Button key={time.startsAt} loading={isBusy} onClick={() => onTake(time)}>
          Book {formatDay(time.startsAt)}, {formatSpan(time.startsAt, time.endsAt)}
        </Button>
      ))}
    </Box>
  );
  return (
    <Banner kind="failed" title="The booking was not made." action={buttons}>
      {detail} Your times are still in the form.
    </Banner>
  );
}
