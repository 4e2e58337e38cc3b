import { Temporal } from 'temporal-polyfill';

/** The demo club's wall clock and the days it is laid around. */
export interface DemoCalendar {
  /** The seeding instant. */
  now: Date;
  /** Today on the club's wall. */
  today: Temporal.PlainDate;
  /** The Thursday of the evening that is on or next. */
  nextNight: Temporal.PlainDate;
  /** The hall is shut between the feasts. */
  isHoliday: (day: Temporal.PlainDate) => boolean;
  /** A club-local wall time as an instant. */
  at: (day: Temporal.PlainDate, hour: number, minute?: number) => Date;
}

const THURSDAY = 4;
const NIGHT_ENDS_AT = 22;

function isHoliday({ month, day }: Temporal.PlainDate): boolean {
  return (month === 12 && day >= 23) || (month === 1 && day === 1);
}

export function calendarAround(now: Date, timeZone: string): DemoCalendar {
  const wall = Temporal.Instant.fromEpochMilliseconds(now.getTime()).toZonedDateTimeISO(timeZone);
  const today = wall.toPlainDate();
  const isOver = today.dayOfWeek === THURSDAY && wall.hour >= NIGHT_ENDS_AT;
  const ahead = isOver ? 7 : (THURSDAY - today.dayOfWeek + 7) % 7;
  let nextNight = today.add({ days: ahead });
  while (isHoliday(nextNight)) nextNight = nextNight.add({ days: 7 });
  const at = (day: Temporal.PlainDate, hour: number, minute = 0): Date =>
    new Date(day.toZonedDateTime({ timeZone, plainTime: { hour, minute } }).epochMilliseconds);
  return { now, today, nextNight, isHoliday, at };
}
