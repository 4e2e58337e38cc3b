import { defineProblems } from '../common/domain-error';

export const nightProblems = defineProblems({
  'night-clash': { status: 409, title: 'Something is taken on these dates' },
  'night-over': { status: 409, title: 'The build night is over' },
  'night-cancelled': { status: 409, title: 'The build night is cancelled' },
  'night-on-duty': { status: 409, title: 'On duty that night' },
  'night-places-taken': { status: 409, title: 'More people are coming' },
});
