import { defineProblems } from '../common/domain-error';

export const ledgerProblems = defineProblems({
  'entry-reversed-before': { status: 409, title: 'The entry was reversed before' },
});
