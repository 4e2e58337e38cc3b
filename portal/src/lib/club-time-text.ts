import { Temporal } from 'temporal-polyfill';
import type { Instant } from './club-time';
import { wallOf, zoned } from './club-time';
import { clubZone } from './club-zone';

// By hand and not by Intl: browsers disagree on "Sep" and "Sept", and on the comma.
const DAYS = ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'];
const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];

const dayName = (day: Temporal.PlainDate) => DAYS[day.dayOfWeek - 1];
const nameOfMonth = (day: Temporal.PlainDate) => MONTHS[day.month - 1];
const two = (value: number) => String(value).padStart(2, '0');

/** A calendar day as text: 'Thu 15 Oct'. */
export function dayText(date: string): string {
  const day = Temporal.PlainDate.from(date);
  return `${dayName(day).slice(0, 3)} ${day.day} ${nameOfMonth(day).slice(0, 3)}`;
}

/** 'Thursday 15 October'. */
export function longDayText(date: string): string {
  const day = Temporal.PlainDate.from(date);
  return `${dayName(day)} ${day.day} ${nameOfMonth(day)}`;
}

/** '9 Dec 2026', for days that may lie in another year. */
export function dateText(date: string): string {
  const day = Temporal.PlainDate.from(date);
  return `${day.day} ${nameOfMonth(day).slice(0, 3)} ${day.year}`;
}

/** 'October 2026'. */
export function monthText(date: string): string {
  const day = Temporal.PlainDate.from(date);
  return `${nameOfMonth(day)} ${day.year}`;
}

/** Minutes since midnight as '19:30'; 1440 reads '24:00'. */
export const clockText = (minute: number): string => `${two(Math.floor(minute / 60))}:${two(minute % 60)}`;

/** A length of time: '1 h', '2 h 30', '45 min'. */
export function lengthText(minutes: number): string {
  const [hours, rest] = [Math.floor(minutes / 60), Math.round(minutes % 60)];
  if (hours === 0) return `${rest} min`;
  return rest === 0 ? `${hours} h` : `${hours} h ${two(rest)}`;
}

/** The club's day of an instant: 'Thu 15 Oct'. */
export const formatDay = (instant: Instant, zone = clubZone()): string => dayText(wallOf(instant, zone).date);

/** The club's date of an instant with its year: '9 Dec 2026'. */
export const formatDate = (instant: Instant, zone = clubZone()): string =>
  dateText(wallOf(instant, zone).date);

/** The club's wall clock at an instant: '19:30'. */
export function formatTime(instant: Instant, zone = clubZone()): string {
  const at = zoned(instant, zone);
  return `${two(at.hour)}:${two(at.minute)}`;
}

/** 'Thu 15 Oct, 19:30'. */
export const formatInClubZone = (instant: Instant, zone = clubZone()): string =>
  `${formatDay(instant, zone)}, ${formatTime(instant, zone)}`;

/** '19:00 to 22:00'; names the second day when it is another one. */
export function formatSpan(from: Instant, to: Instant, zone = clubZone()): string {
  const sameDay = wallOf(from, zone).date === wallOf(to, zone).date;
  const end = sameDay ? formatTime(to, zone) : formatInClubZone(to, zone);
  return `${formatTime(from, zone)} to ${end}`;
}
