import { addDays } from '../../lib/club-time';
import { dayText, longDayText, monthText } from '../../lib/club-time-text';
import { capital, countWord, listText } from '../../lib/text';

const DAY_NAMES = ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'];
const DAY_CODES = ['MO', 'TU', 'WE', 'TH', 'FR', 'SA', 'SU'];
const ORDINALS = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth'];

const dayName = (date: string): string => longDayText(date).split(' ')[0];

/** How often a series comes: every so many weeks, in the words of the form. */
export type Repeats = 'once' | 'each week' | 'every second week';

/** The RRULE for so many nights; undefined for a single one. */
export function ruleOf(repeats: Repeats, nights: number): string | undefined {
  if (repeats === 'once') return undefined;
  const interval = repeats === 'each week' ? '' : 'INTERVAL=2;';
  return `FREQ=WEEKLY;${interval}COUNT=${nights}`;
}

/**
 * A rule in words, for a series one of whose nights is on `date`.
 * @example ruleWords('FREQ=WEEKLY;COUNT=22', '2026-10-15') //=> 'Thursdays'
 */
export function ruleWords(rule: string, date: string): string {
  const parts = new Map(rule.split(';').map((part) => part.split('=') as [string, string]));
  const codes = parts.get('BYDAY')?.split(',');
  const days = codes ? DAY_NAMES.filter((_name, index) => codes.includes(DAY_CODES[index])) : [dayName(date)];
  const interval = Number(parts.get('INTERVAL') ?? 1);
  if (interval === 1) return listText(days.map((day) => `${day}s`));
  return `every ${ORDINALS[interval - 1] ?? `${interval}th`} ${listText(days)}`;
}

/** 'Bench 3', 'Benches 1 to 4', 'Benches 1, 3 and 4'; other tags as they are. */
export function benchWords(tags: readonly string[]): string {
  const numbers = tags.map((tag) => Number(/^Bench (\d+)$/.exec(tag)?.[1] ?? Number.NaN));
  if (numbers.some(Number.isNaN) || tags.length < 2) return listText(tags);
  const sorted = [...numbers].sort((a, b) => a - b);
  const isRun = sorted.every((value, index) => value === sorted[0] + index);
  if (isRun && sorted.length > 2) return `Benches ${sorted[0]} to ${sorted[sorted.length - 1]}`;
  return `Benches ${listText(sorted.map(String))}`;
}

/** '8 of 8' and who waits: '8 of 8, two waiting'. */
export function placesWords({ coming, places, waiting }: Counts): string {
  return waiting === 0 ? `${coming} of ${places}` : `${coming} of ${places}, ${countWord(waiting)} waiting`;
}

interface Counts {
  coming: number;
  places: number;
  waiting: number;
}

/** 'first in line' */
export const lineWords = (line: number): string => `${ORDINALS[line - 1] ?? `number ${line}`} in line`;

/** 'Six Tuesdays, to 24 November'; one night by its day; days that differ are 'nights'. */
export function plannedWords(dates: readonly string[]): string {
  const [first, last] = [dates[0], dates[dates.length - 1]];
  if (!first || !last) return 'No night';
  if (dates.length === 1) return dayText(first);
  const isOneDay = dates.every((date) => dayName(date) === dayName(first));
  const noun = isOneDay ? `${dayName(first)}s` : 'nights';
  return `${capital(countWord(dates.length))} ${noun}, to ${longDayText(last).replace(/^\w+ /, '')}`;
}

/** 'Schedule six, two clash'; without a clash 'Schedule six'. */
export function scheduleWords(nights: number, clashes: number): string {
  if (nights === 1 && clashes === 0) return 'Schedule the night';
  if (nights === 1) return 'Schedule the night, it clashes';
  const all = `Schedule ${countWord(nights)}`;
  return clashes === 0 ? all : `${all}, ${countWord(clashes)} ${clashes === 1 ? 'clashes' : 'clash'}`;
}

/** What the word beside the tick says of who is told. */
export function tellWords(people: number): string {
  if (people === 0) return 'Nobody’s build is on those stages, so nobody is told by mail';
  if (people === 1) return 'Tell the one person on those stages by mail';
  return `Tell the ${countWord(people)} people on those stages by mail`;
}

interface MonthGroup<T> {
  /** '2026-10-01' */
  month: string;
  /** 'October', with its year when that is not this year's. */
  heading: string;
  nights: T[];
}

/** Nights by the month of their day, in the order given. */
export function byMonth<T>(
  nights: readonly T[],
  dayOf: (night: T) => string,
  today: string,
): MonthGroup<T>[] {
  const groups: MonthGroup<T>[] = [];
  for (const night of nights) {
    const month = `${dayOf(night).slice(0, 7)}-01`;
    const open = groups.find((group) => group.month === month);
    if (open) open.nights.push(night);
    else groups.push({ month, heading: monthHeading(month, today), nights: [night] });
  }
  return groups;
}

function monthHeading(month: string, today: string): string {
  const text = monthText(month);
  return month.slice(0, 4) === today.slice(0, 4) ? text.split(' ')[0] : text;
}

/** The days a month's grid shows, Monday to Sunday: from the first, and up to but not with the second. */
export function gridDays(month: string, weekStart: (day: string) => string): { from: string; to: string } {
  const next = addDays(month, 31).slice(0, 7);
  const lastDay = addDays(`${next}-01`, -1);
  return { from: weekStart(month), to: addDays(weekStart(lastDay), 7) };
}
