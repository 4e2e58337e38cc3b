import { defineProblems } from '../common/domain-error';

export const authProblems = defineProblems({
  'wrong-email-or-password': { status: 401, title: 'That email and password do not match' },
  'session-ended': { status: 401, title: 'Your sign-in has run out' },
});
