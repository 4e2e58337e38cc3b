import { defineProblems } from '../common/domain-error';

export const reconciliationProblems = defineProblems({
  'statement-unreadable': { status: 422, title: 'The statement cannot be read' },
  'statement-imported-before': { status: 409, title: 'The statement was imported before' },
  'statement-does-not-follow': { status: 409, title: 'The statement does not follow the last one' },
  'line-matched-before': { status: 409, title: 'The line is matched already' },
  'line-not-matched': { status: 409, title: 'The line is not matched' },
  'match-does-not-fit': { status: 409, title: 'The line and the books do not fit' },
});
