/** One field at fault: a JSON pointer into what was sent, and words for the person who typed it. */
export interface FieldProblem {
  pointer: string;
  detail: string;
}

interface ProblemParts {
  type: string;
  title: string;
  status: number;
  detail: string;
  errors?: FieldProblem[];
  /** The whole document, for members a feature knows, such as the nearest free times. */
  body?: Readonly<Record<string, unknown>>;
}

/** A refusal of the API (RFC 9457), or status 0 when there was no answer at all. */
export class ProblemError extends Error {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly errors: readonly FieldProblem[];
  readonly body: Readonly<Record<string, unknown>>;

  constructor(parts: ProblemParts) {
    super(parts.detail || parts.title);
    this.type = parts.type;
    this.title = parts.title;
    this.status = parts.status;
    this.detail = parts.detail;
    this.errors = parts.errors ?? [];
    this.body = parts.body ?? {};
  }

  /** @example error.is('booking-overlap') */
  is(code: string): boolean {
    return this.type === `/problems/${code}`;
  }
}

export const noConnection = (): ProblemError =>
  new ProblemError({
    type: '/problems/no-connection',
    title: 'No connection',
    status: 0,
    detail: 'What you typed is kept on this device. Try again when the connection returns.',
  });

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const textIn = (body: Record<string, unknown>, field: string): string =>
  typeof body[field] === 'string' ? body[field] : '';

function fieldProblems(value: unknown): FieldProblem[] {
  if (!Array.isArray(value)) return [];
  return value
    .filter(isRecord)
    .map((entry) => ({ pointer: textIn(entry, 'pointer'), detail: textIn(entry, 'detail') }));
}

/** Reads the body of an answer that is not a success; one that is no problem document gets words of ours. */
export function problemFrom(status: number, body: unknown): ProblemError {
  const document = isRecord(body) ? body : {};
  return new ProblemError({
    type: textIn(document, 'type') || 'about:blank',
    title: textIn(document, 'title') || 'It did not work',
    status,
    detail:
      textIn(document, 'detail') ||
      `The club's server answered ${status}. What you typed is kept on this device.`,
    errors: fieldProblems(document.errors),
    body: document,
  });
}
