import type { Span } from '../bookings/bookings.service';
import { wallOf, type WallTime } from './wall-time.rules';

const DAYS = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'];
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

const clock = (wall: WallTime): string => wall.toPlainTime().toString({ smallestUnit: 'minute' });
const day = (wall: WallTime): string => `${DAYS[wall.dayOfWeek - 1]} ${wall.day} ${MONTHS[wall.month - 1]}`;

/** `19:30`, on the club's wall. */
export function timeText(instant: Date, zone: string): string {
  return clock(wallOf(instant, zone));
}

/** `Thu 22 Oct` */
export function dayText(instant: Date, zone: string): string {
  return day(wallOf(instant, zone));
}

/** `19:00 to 22:00` */
export function spanText({ startsAt, endsAt }: Span, zone: string): string {
  return `${timeText(startsAt, zone)} to ${timeText(endsAt, zone)}`;
}

/** `Thu 22 Oct, 19:00 to 22:00` */
export function whenText(span: Span, zone: string): string {
  return `${dayText(span.startsAt, zone)}, ${spanText(span, zone)}`;
}

/** `Hollis, Greta and Oona` */
export function listText(words: readonly string[]): string {
  const last = words.at(-1) ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} and ${last}`;
}

/** `Larkmoor Twenty, night 15`; a night on its own by its title. */
export function nightName({ title, number }: { title: string; number: number | null }): string {
  return number === null ? title : `${title}, night ${number}`;
}
