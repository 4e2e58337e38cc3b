import { defineProblems } from '../common/domain-error';

export const planProblems = defineProblems({
  'plan-does-not-meet': { status: 422, title: 'The stages of the plan do not meet' },
  'edition-published-already': { status: 409, title: 'That edition is published already' },
});
