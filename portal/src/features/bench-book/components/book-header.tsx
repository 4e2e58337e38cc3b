import Button from '@mui/material/Button';
import { Temporal } from 'temporal-polyfill';
import { addDays, clubDay } from '../../../lib/club-time';
import { longDayText } from '../../../lib/club-time-text';
import { Icon } from '../../../shared-ui/icon';
import { FOCUS_BACK } from '../../../shared-ui/use-focus-back';
import { PageTitle } from '../../../shared-ui/page-title';
import { sameDayIn } from '../book-view';

interface BookHeaderProps {
  week: string;
  day: string;
  onDay: (day: string) => void;
  /** Left out while the form is open. */
  onBook?: () => void;
}

const monthOf = (date: string): string => longDayText(date).split(' ')[2] ?? '';
const numberOf = (date: string): number => Temporal.PlainDate.from(date).day;

/** The week's days as the page's title, the way to other weeks, and the form. */
export function BookHeader({ week, day, onDay, onBook }: BookHeaderProps) {
  const last = addDays(week, 6);
  const isOneMonth = monthOf(week) === monthOf(last);
  return (
    <PageTitle
      tab="Bench book"
      actions={
        <>
          <Button
            aria-label="Week before"
            onClick={() => onDay(sameDayIn(day, -1))}
            sx={{ minWidth: 44, px: 0 }}
          >
            <Icon name="back" size={16} />
          </Button>
          <Button onClick={() => onDay(clubDay())}>This week</Button>
          <Button
            aria-label="Week after"
            onClick={() => onDay(sameDayIn(day, 1))}
            sx={{ minWidth: 44, px: 0 }}
          >
            <Icon name="forward" size={16} />
          </Button>
          {onBook && (
            <Button variant="contained" onClick={onBook} {...FOCUS_BACK}>
              Book a bench
            </Button>
          )}
        </>
      }
    >
      {numberOf(week)} {!isOneMonth && monthOf(week)} to {isOneMonth && numberOf(last)}{' '}
      <b>
        {!isOneMonth && numberOf(last)} {monthOf(last)}
      </b>
    </PageTitle>
  );
}
