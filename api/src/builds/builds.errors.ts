import { defineProblems } from '../common/domain-error';

export const buildProblems = defineProblems({
  'build-started-already': { status: 409, title: 'You have a build of that plan' },
  'stage-locked': { status: 409, title: 'Something earlier must be done first' },
  'stage-out-of-hand': { status: 409, title: 'The stage is not in your hands' },
  'stage-not-with-mentor': { status: 409, title: 'The stage is not with a mentor' },
  'checks-missing': { status: 409, title: 'Checks are still missing' },
  'photos-enough': { status: 409, title: 'The check has all the photos it takes' },
  'worksheets-enough': { status: 409, title: 'The stage has all the calculations it takes' },
  'readings-out-of-date': { status: 409, title: 'A reading it was made of was taken again' },
  'own-stage': { status: 403, title: 'Your own stage is signed off by somebody else' },
  'licence-seen-already': { status: 409, title: 'The licence was seen already' },
});
