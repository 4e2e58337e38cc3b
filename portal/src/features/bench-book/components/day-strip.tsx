import Box from '@mui/material/Box';
import IconButton from '@mui/material/IconButton';
import { clubDay } from '../../../lib/club-time';
import { dayText, longDayText } from '../../../lib/club-time-text';
import { Icon } from '../../../shared-ui/icon';
import { sameDayIn } from '../book-view';

interface DayStripProps {
  dates: readonly string[];
  day: string;
  onDay: (day: string) => void;
}

/** The week's days on a phone, one of them open; the arrows lead to the weeks around. */
export function DayStrip({ dates, day, onDay }: DayStripProps) {
  const today = clubDay();
  return (
    <Box
      component="nav"
      aria-label="Days of the week"
      sx={{
        display: 'flex',
        alignItems: 'stretch',
        mx: '-16px',
        borderBottom: '1px solid',
        borderColor: 'token.rule',
      }}
    >
      <IconButton aria-label="Week before" onClick={() => onDay(sameDayIn(day, -1))} sx={ARROW}>
        <Icon name="back" size={16} />
      </IconButton>
      {dates.map((date) => {
        const [name, number] = dayText(date).split(' ');
        return (
          <Box
            key={date}
            component="button"
            type="button"
            aria-label={longDayText(date)}
            aria-current={date === day ? 'date' : undefined}
            onClick={() => onDay(date)}
            sx={{
              flex: 1,
              minWidth: 0,
              minHeight: 56,
              p: '6px 0 3px',
              border: 0,
              borderBottom: '3px solid',
              borderColor: date === day ? 'token.green' : 'transparent',
              backgroundColor: date === day ? 'token.sheet' : 'transparent',
              font: 'inherit',
              color: date < today ? 'token.ink3' : 'token.ink',
              fontWeight: date === day ? 700 : 400,
            }}
          >
            <Box sx={{ typography: 'least', fontWeight: 'inherit' }}>{name}</Box>
            <Box sx={{ fontSize: '1.0625rem', fontWeight: date === today || date === day ? 700 : 400 }}>
              {number}
            </Box>
          </Box>
        );
      })}
      <IconButton aria-label="Week after" onClick={() => onDay(sameDayIn(day, 1))} sx={ARROW}>
        <Icon name="forward" size={16} />
      </IconButton>
    </Box>
  );
}

const ARROW = { width: 28, height: 'auto', flex: 'none' } as const;
