import { defineProblems } from '../common/domain-error';

export const instrumentProblems = defineProblems({
  'clearance-in-hand': { status: 409, title: 'Somebody else is giving this clearance' },
});
