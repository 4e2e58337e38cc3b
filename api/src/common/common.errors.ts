import { defineProblems, type DomainError } from './domain-error';

export const commonProblems = defineProblems({
  'invalid-input': { status: 422, title: 'Something in the form needs another look' },
  'unreadable-request': { status: 400, title: 'The request cannot be read' },
  'not-signed-in': { status: 401, title: 'Not signed in' },
  'not-allowed': { status: 403, title: 'Not allowed' },
  'foreign-origin': { status: 403, title: 'The request came from another site' },
  'not-found': { status: 404, title: 'Not found' },
  'too-large': { status: 413, title: 'Too large' },
  'wrong-kind-of-file': { status: 415, title: 'The wrong kind of file' },
  'slow-down': { status: 429, title: 'Too many tries' },
  busy: { status: 503, title: 'Too much at once' },
  unplanned: { status: 500, title: 'Something went wrong' },
  'not-now': { status: 503, title: 'Not to be had at the moment' },
});

/** A 422 about one field of the request body; `field` may be a path such as `items.0.startsAt`. */
export function fieldError(field: string, detail: string): DomainError {
  const pointer = `#/${field.replaceAll('.', '/')}`;
  return commonProblems['invalid-input'](detail, { errors: [{ pointer, detail }] });
}

export function notFound(what: string): DomainError {
  return commonProblems['not-found'](`There is no such ${what}, or it is not yours to see.`);
}

export function notAllowed(detail: string): DomainError {
  return commonProblems['not-allowed'](detail);
}
