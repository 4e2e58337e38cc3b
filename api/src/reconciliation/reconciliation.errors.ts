import { defineProblems } from '../common/domain-error';

export const reconciliationProblems = defineProblems({
  'statement-unreadable': { status: 422, title: 'The statement cannot be read' },
  'statement-imported-before': { status: 409, title: 'The statement was imported before' },
  'statement-does-not-follow': { status: 409, title: 'The statement does not follow the last one' },
  'line-matched-before': { status: 409, title: 'The line is matched already' },
  'line-not-matched': { status: 409, title: 'The line is not matched' },
  'match-does-not-fit': { status: 409, title: 'The line and the books do not fit' },
});

export const matchedBefore = (): Error =>
  reconciliationProblems['line-matched-before']('The line is matched already. Take that back first.');

/** What the database says of a match that somebody else's act has overtaken. */
export const MATCH_REFUSALS = {
  line_match_line_once: matchedBefore,
  line_match_payment_once: (): Error =>
    reconciliationProblems['match-does-not-fit']('That payment stands for another line already.'),
  line_match_of_a_live_payment: (): Error =>
    reconciliationProblems['match-does-not-fit']('That payment was taken back.'),
};
