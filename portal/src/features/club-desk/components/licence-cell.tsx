import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { formatDay } from '../../../lib/club-time-text';
import { StateMark } from '../../../shared-ui/states/shape';
import type { Licence } from '../api/licences';

interface LicenceCellProps {
  licences: readonly Licence[];
  onSeen: (licence: Licence) => void;
}

/** When the licence was seen and by whom, or the padlock that keeps the way on the air shut. */
export function LicenceCell({ licences, onSeen }: LicenceCellProps) {
  return licences.map((licence) => (
    <Box
      key={licence.buildId}
      sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '4px 10px' }}
    >
      {licence.seenAt ? (
        <span>
          {formatDay(licence.seenAt)}
          {licence.seenBy && `, by ${licence.seenBy.name}`}
        </span>
      ) : (
        <>
          <Box
            component="span"
            sx={{ display: 'inline-flex', alignItems: 'center', gap: '6px', color: 'token.ink2' }}
          >
            <StateMark name="padlock" size={14} />
            Not seen
          </Box>
          <Button
            size="small"
            aria-label={`Licence of ${licence.builder.name} seen`}
            onClick={() => onSeen(licence)}
          >
            Seen
          </Button>
        </>
      )}
    </Box>
  ));
}
