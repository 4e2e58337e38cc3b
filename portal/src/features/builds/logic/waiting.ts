import { minutesBetween, type Instant } from '../../../lib/club-time';
import { counted } from '../../../lib/text';

const HOUR = 60;
const DAY = 24 * HOUR;

/** How long something has waited: '20 min', '3 h', '2 days'. */
export function waitedText(since: Instant, now: Instant): string {
  const minutes = Math.max(0, Math.floor(minutesBetween(since, now)));
  if (minutes < HOUR) return `${minutes} min`;
  if (minutes < DAY) return `${Math.floor(minutes / HOUR)} h`;
  const days = Math.floor(minutes / DAY);
  return `${days} ${days === 1 ? 'day' : 'days'}`;
}

/** 'Five waiting, longest two days', for the head of the queue. */
export function queueText(sentAt: readonly Instant[], now: Instant): string {
  const [longest] = sentAt;
  if (longest === undefined) return 'Nothing waiting';
  const count = counted(sentAt.length, 'waiting', 'waiting');
  return `${count.charAt(0).toUpperCase()}${count.slice(1)}, longest ${waitedText(longest, now)}`;
}
