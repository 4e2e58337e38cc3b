import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { carryOut } from '../../../api-client/carry-out';
import { useMe } from '../../../api-client/session';
import { formatInClubZone } from '../../../lib/club-time-text';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useMark, type BuildCheck } from '../api/builds';

interface TickCardProps {
  buildId: string;
  check: BuildCheck;
  onDone: () => void;
}

/** A check that is ticked, or a safety check that is acknowledged by name. */
export function TickCard({ buildId, check, onDone }: TickCardProps) {
  const me = useMe();
  const marking = useMark(buildId);
  const isSafety = check.kind === 'safety';
  const press = (isMarked: boolean) =>
    carryOut(marking, { checkId: check.id, isMarked }, { onSuccess: () => isMarked && onDone() });
  return (
    <Box>
      {check.mark ? (
        <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '8px' }}>
          <Typography variant="small" component="span">
            {isSafety ? 'Acknowledged' : 'Done'} by {check.mark.by.name}, {formatInClubZone(check.mark.at)}.
          </Typography>
          <Button size="small" onClick={() => press(false)} loading={marking.isPending}>
            Take it back
          </Button>
        </Box>
      ) : (
        <Button variant="contained" onClick={() => press(true)} loading={marking.isPending}>
          {isSafety ? `Acknowledge as ${me.name}` : 'Done'}
        </Button>
      )}
      {marking.isError && <ProblemAlert title="Not sent yet." error={marking.error} />}
    </Box>
  );
}
