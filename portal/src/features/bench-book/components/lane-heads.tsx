import Box from '@mui/material/Box';
import { Temporal } from 'temporal-polyfill';
import { clubDay } from '../../../lib/club-time';
import { dayText, longDayText } from '../../../lib/club-time-text';
import type { Lane } from '../lanes/lane';

interface LaneHeadsProps {
  dates: readonly string[];
  lanes: readonly Lane[];
  /** A phone has its strip of days above, so the lanes' names are enough. */
  hasDays: boolean;
}

const numberOf = (date: string): number => Temporal.PlainDate.from(date).day;

/** Two rows over the lanes: the days, and under each day the benches and instruments. */
export function LaneHeads({ dates, lanes, hasDays }: LaneHeadsProps) {
  const today = clubDay();
  const top = hasDays ? DAYS_HEIGHT : 0;
  return (
    <>
      {hasDays && (
        <Box role="row" aria-rowindex={1} sx={{ display: 'contents' }}>
          <Box role="columnheader" aria-label="Time" sx={{ ...STICKY, top: 0 }} />
          {dates.map((date) => (
            <Box
              key={date}
              role="columnheader"
              aria-colspan={lanes.length}
              aria-label={longDayText(date)}
              aria-current={date === today ? 'date' : undefined}
              sx={{
                ...STICKY,
                top: 0,
                height: DAYS_HEIGHT,
                gridColumn: `span ${lanes.length}`,
                p: '4px 8px 6px',
                borderTop: '3px solid',
                borderColor: date === today ? 'token.green' : 'transparent',
              }}
            >
              <Box sx={{ typography: 'small', color: 'token.ink2' }}>{dayText(date).slice(0, 3)}</Box>
              <Box sx={{ fontSize: '1.25rem', lineHeight: '1.5rem', fontWeight: date === today ? 700 : 300 }}>
                {numberOf(date)}
              </Box>
            </Box>
          ))}
        </Box>
      )}
      <Box role="row" aria-rowindex={hasDays ? 2 : 1} sx={{ display: 'contents' }}>
        <Box role="columnheader" aria-label="Time" sx={{ ...UNDER, top }} />
        {dates.flatMap((date) =>
          lanes.map((lane, index) => (
            <Box
              key={`${date}:${lane.id}`}
              role="columnheader"
              aria-label={`${lane.tag}, ${lane.name}, ${dayText(date)}`}
              sx={{ ...UNDER, ...NAME, top, borderLeftColor: index === 0 ? 'token.edge' : 'token.rule' }}
            >
              {lane.tag}
            </Box>
          )),
        )}
      </Box>
    </>
  );
}

const DAYS_HEIGHT = 58;

/** Heads stay in sight while the day scrolls under them, drawings and cursor too. */
const STICKY = { position: 'sticky', zIndex: 4, backgroundColor: 'token.paper' } as const;

const UNDER = {
  ...STICKY,
  borderTop: '1px solid',
  borderTopColor: 'token.rule',
  borderBottom: '1.5px solid',
  borderBottomColor: 'token.ink',
} as const;

const NAME = {
  borderLeft: '1px solid',
  p: '3px 2px',
  overflow: 'hidden',
  textAlign: 'center',
  textOverflow: 'clip',
  whiteSpace: 'nowrap',
  typography: 'least',
  color: 'token.ink2',
} as const;
