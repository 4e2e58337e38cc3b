import { defineProblems, type DomainError } from '../common/domain-error';
import { spanWords } from '../common/wall-clock';
import type { UseReason } from '../instruments/instrument-use.service';
import type { Clash, Span } from './bookings.types';

export const bookingProblems = defineProblems({
  'booking-overlap': { status: 409, title: 'The booking was not made' },
  'booking-over': { status: 409, title: 'The booking is over' },
  'booking-of-build-night': { status: 409, title: 'It belongs to a build night' },
  'not-bookable': { status: 422, title: 'Not to be booked like this' },
});

/** Who has what, in words for the person who asked, and when else everything is free. */
export function overlap(
  clashes: readonly Clash[],
  nearestFree: readonly Span[],
  { zone, personId }: { zone: string; personId: string },
): DomainError {
  const who = clashes.map((clash) => clashWords(clash, zone, personId)).join(' ');
  const what = who || 'Somebody had it a moment ago.';
  const takenBy = clashes.map(({ resourceId, resourceTag, startsAt, endsAt, ...clash }) => {
    return { resourceId, resourceTag, by: holderOf(clash), startsAt, endsAt };
  });
  const advice = nearestFree.length > 0 ? 'Choose one of the nearest free times, or' : 'Choose';
  return bookingProblems['booking-overlap'](
    `${what} ${advice} another bench or instrument. Nothing was booked.`,
    { extra: { takenBy, nearestFree } },
  );
}

/** Which instruments may not be used like this; the field at fault is the place in the list. */
export function notBookable(
  resourceIds: readonly string[],
  reasons: ReadonlyMap<string, readonly UseReason[]>,
): DomainError {
  const refused = [...reasons].map(([resourceId, against]) => ({ resourceId, reasons: against }));
  const errors = refused.flatMap(({ resourceId, reasons: against }) =>
    against.map(({ reason, remedy }) => ({
      pointer: `#/resourceIds/${resourceIds.indexOf(resourceId)}`,
      detail: `${reason} ${remedy}`,
    })),
  );
  return bookingProblems['not-bookable'](errors.map(({ detail }) => detail).join(' '), {
    errors,
    extra: { refused },
  });
}

function clashWords(clash: Clash, zone: string, personId: string): string {
  const { kind, resourceTag } = clash;
  const when = spanWords(clash, zone);
  if (kind === 'build night') return `${resourceTag} is held for ${holderOf(clash)}, ${when}.`;
  if (clash.personId === personId) return `You already have ${resourceTag} then, ${when}.`;
  return `${resourceTag} went to ${holderOf(clash)}, ${when}.`;
}

function holderOf({ kind, title, personName }: Pick<Clash, 'kind' | 'title' | 'personName'>): string {
  return kind === 'build night' ? title : personName;
}
