/** What a screen says when something did not work. */
export interface Failure {
  kind: 'no-connection' | 'not-allowed' | 'gone' | 'failed';
  title: string;
  detail: string;
}

const KINDS: Record<number, Failure['kind']> = { 0: 'no-connection', 403: 'not-allowed', 404: 'gone' };

function textOf(error: object, field: string): string | undefined {
  const value: unknown = Reflect.get(error, field);
  return typeof value === 'string' && value !== '' ? value : undefined;
}

/** Reads a problem of the API, or any thrown thing, into words fit for a member. */
export function failureOf(error: unknown): Failure {
  if (typeof error === 'object' && error !== null && 'status' in error && typeof error.status === 'number') {
    return {
      kind: KINDS[error.status] ?? 'failed',
      title: textOf(error, 'title') ?? 'It did not work',
      detail: textOf(error, 'detail') ?? '',
    };
  }
  return {
    kind: 'failed',
    title: 'This part stopped working',
    detail: 'What you typed is kept on this device. Try again, or load the page again.',
  };
}
