/** One field at fault: where (a JSON pointer into the request body) and what, in words for a member. */
export interface FieldProblem {
  pointer: string;
  detail: string;
}

export interface ProblemKind {
  status: 400 | 401 | 403 | 404 | 409 | 413 | 415 | 422 | 429 | 500 | 503;
  /** The same for every occurrence of the kind. */
  title: string;
}

export interface ProblemExtras {
  errors?: FieldProblem[];
  /** Members added to the problem document as they are, such as the nearest free times. */
  extra?: Record<string, unknown>;
}

/** A refusal, answered as RFC 9457 problem details. `detail` is read by a member. */
export class DomainError extends Error {
  constructor(
    readonly code: string,
    readonly kind: ProblemKind,
    readonly detail: string,
    readonly extras: ProblemExtras = {},
  ) {
    super(detail);
  }
}

const registry = new Map<string, ProblemKind>();

/** Every kind of problem the API can answer with, by code; shown at /problems. */
export function allProblems(): ReadonlyMap<string, ProblemKind> {
  return registry;
}

type ProblemFactory = (detail: string, extras?: ProblemExtras) => DomainError;

/**
 * Declares a feature's problems, one factory for each code.
 *
 * @throws Error when two features claim one code.
 * @example const bookingProblems = defineProblems({ 'booking-overlap': { status: 409, title: 'Already taken' } });
 *          throw bookingProblems['booking-overlap']('Bench 3 went to Lena at 13:12.');
 */
export function defineProblems<Code extends string>(
  kinds: Record<Code, ProblemKind>,
): Record<Code, ProblemFactory> {
  const entries = Object.entries<ProblemKind>(kinds).map(([code, kind]) => {
    if (registry.has(code)) throw new Error(`The problem code ${code} is declared twice.`);
    registry.set(code, kind);
    const factory: ProblemFactory = (detail, extras) => new DomainError(code, kind, detail, extras);
    return [code, factory];
  });
  return Object.fromEntries(entries) as Record<Code, ProblemFactory>;
}
