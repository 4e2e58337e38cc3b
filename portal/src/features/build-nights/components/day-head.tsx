import Box from '@mui/material/Box';
import { clockChange, weekStart } from '../../../lib/club-time';
import { dayText, formatTime } from '../../../lib/club-time-text';
import type { BuildNight } from '../api/nights';
import { mainSeries } from '../night-view';

interface DayHeadProps {
  day: string;
  month: string;
  /** 'tonight', 'today' */
  word?: string;
  /** Nights in view: at what time they usually begin. */
  usual: readonly BuildNight[];
}

/** Top of a day's cell: its number, with the month's name at a month's edge, and a change of the clocks. */
export function DayHead({ day, month, word, usual }: DayHeadProps) {
  const [, number, monthName] = dayText(day).split(' ');
  const isEdge = day.endsWith('-01') || day === weekStart(month);
  const change = clockChange(day);
  return (
    <>
      <Box
        component="span"
        sx={{
          display: 'flex',
          justifyContent: 'space-between',
          fontSize: '0.8125rem',
          lineHeight: '1.125rem',
          fontWeight: word || day.startsWith(month.slice(0, 7)) ? 700 : 600,
          color: word ? 'token.ink' : undefined,
        }}
      >
        <span>{isEdge ? `${number} ${monthName}` : number}</span>
        {word && (
          <Box component="span" sx={{ display: { xs: 'none', md: 'inline' } }}>
            {word}
          </Box>
        )}
      </Box>
      {change && (
        <Box
          component="span"
          sx={{ display: 'block', mt: '6px', fontSize: '0.75rem', lineHeight: '1rem', color: 'token.ink2' }}
        >
          Clocks {change}. {stayWords(usual)}
        </Box>
      )}
    </>
  );
}

function stayWords(nights: readonly BuildNight[]): string {
  const main = mainSeries(nights);
  const one = nights.find(({ series }) => series && series.id === main?.id);
  return one ? `Nights stay at ${formatTime(one.startsAt)}.` : 'Nights stay at their time.';
}
