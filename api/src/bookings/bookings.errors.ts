import { defineProblems } from '../common/domain-error';

export const bookingProblems = defineProblems({
  'booking-overlap': { status: 409, title: 'Already taken' },
  'booking-over': { status: 409, title: 'The booking is over' },
  'booking-of-build-night': { status: 409, title: 'It belongs to a build night' },
  'not-bookable': { status: 422, title: 'Not to be booked like this' },
});
