import { dateText, formatTime } from '../../../lib/club-time-text';
import type { Booking, Instrument } from '../api/bench-book';
import type { TypedTimes } from './booking-values';

export interface InstrumentWords {
  /** At the right of the name: whose it is then. */
  end: string;
  /** Under the name. */
  line: string;
  tone: 'plain' | 'brass';
}

/** The booking that holds a bench or instrument in the typed times, if one does. */
export function holderOf(
  resourceId: string,
  times: TypedTimes | undefined,
  bookings: readonly Booking[],
): Booking | undefined {
  if (!times) return undefined;
  return bookings.find(
    ({ resources, startsAt, endsAt }) =>
      resources.some(({ id }) => id === resourceId) &&
      Date.parse(startsAt) < Date.parse(times.endsAt) &&
      Date.parse(endsAt) > Date.parse(times.startsAt),
  );
}

/** 'Lena Quist has it 14:00 to 16:00.' */
export function holderWords({ kind, title, mine, personName, startsAt, endsAt }: Booking): string {
  const who = kind === 'build night' ? title : mine ? 'You have' : personName;
  const times = `${formatTime(startsAt)} to ${formatTime(endsAt)}`;
  return mine && kind === 'session' ? `You have it ${times}.` : `${who} has it ${times}.`;
}

/** Whether and why an instrument can be had, in the order a person asks: may I, is it free, until when is it good. */
export function instrumentWords(instrument: Instrument, holder: Booking | undefined): InstrumentWords {
  const { mayBook, reasons, kind, calibrationDueOn } = instrument;
  if (!mayBook)
    return {
      end: '',
      tone: 'plain',
      line: reasons.map(({ reason, remedy }) => `${reason} ${remedy}`).join(' '),
    };
  if (holder) return { end: 'taken', tone: 'brass', line: holderWords(holder) };
  const cleared = kind.needsClearance ? 'You are cleared.' : 'No clearance needed.';
  const due = calibrationDueOn === null ? '' : ` Calibration due ${dateText(calibrationDueOn)}.`;
  return { end: 'free', tone: 'plain', line: cleared + due };
}
