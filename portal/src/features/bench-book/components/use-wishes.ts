import { useWatch, type Control } from 'react-hook-form';
import { readClock } from '../../../lib/club-time';
import type { BookingValues } from '../form/booking-values';
import type { Wish } from './lane-day';

/** What the form asks for, as the lanes draw it; nothing while the times cannot be read. */
export function useWishes(control: Control<BookingValues>, isOpen: boolean): Wish[] {
  const values = useWatch({ control, compute: (now) => ({ ...now }) });
  const [from, to] = [readClock(values.from), readClock(values.to)];
  if (!isOpen || from === undefined || to === undefined || to <= from) return [];
  const ids = [values.benchId, ...values.instrumentIds].filter((id) => id !== '');
  return ids.map((laneId) => ({ date: values.day, laneId, from, to }));
}
