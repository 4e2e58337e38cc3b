import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { dayText } from '../../../lib/club-time-text';
import { formatMoney } from '../../../lib/money';
import { StateMark } from '../../../shared-ui/states/shape';
import type { MyDues } from '../api/dues';
import type { Standing } from '../standing';

/** The page's copper: something is past due, what clears it, and whom to ask. The page stays open under it. */
export function ArrearsBanner({ standing, dues }: { standing: Standing; dues: MyDues }) {
  const late = standing.owed.filter(({ daysLate }) => daysLate > 0);
  const [oldest] = late;
  if (!oldest) return null;
  const firstName = dues.treasurerName.split(' ')[0] ?? '';
  return (
    <Box
      role="status"
      sx={{
        display: 'flex',
        flexWrap: 'wrap',
        alignItems: 'center',
        gap: '10px 16px',
        mb: '14px',
        p: '11px 16px',
        border: '1px solid',
        borderColor: 'token.copper',
        borderRadius: '3px',
        backgroundColor: 'token.copperTint',
      }}
    >
      <Box sx={{ color: 'token.copper', lineHeight: 0 }}>
        <StateMark name="pennant" size={20} />
      </Box>
      <Box sx={{ flex: '1 1 300px' }}>
        <b>{formatMoney(standing.lateMinor, dues.currency)} is past due</b>
        <Typography variant="small" component="div">
          {oldest.description} was due on {dayText(oldest.dueOn)}
          {late.length > 1 && `, and ${late.length - 1} more`}. A card payment clears this in seconds, a
          transfer when the bank shows it.
        </Typography>
      </Box>
      {dues.contactEmail && (
        <Button href={`mailto:${dues.contactEmail}`}>
          {firstName ? `Ask ${firstName}` : 'Ask the treasurer'}
        </Button>
      )}
    </Box>
  );
}
