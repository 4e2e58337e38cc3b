import { OutOfDomainError } from './errors';

/** What one numeric input permits. Bounds left out are open, but the number must always be finite. */
export interface Domain {
  /** Name of the input as the caller knows it. */
  input: string;
  /** Name of the input as a member reads it. */
  label: string;
  unit?: string;
  above?: number;
  atLeast?: number;
  below?: number;
  atMost?: number;
}

/**
 * The value itself when its domain permits it.
 *
 * @throws OutOfDomainError otherwise, with the value one decimal place lower as suggestion when that would fit.
 */
export function requireWithin(domain: Domain, value: number): number {
  if (isWithin(domain, value)) return value;
  const permitted = permittedText(domain);
  const suggestion = suggestionFor(domain, value);
  const question = suggestion === undefined ? '' : ` Did you mean ${suggestion}?`;
  const message = Number.isFinite(value)
    ? `${domain.label}: ${value} is outside what is possible here, ${permitted}.${question}`
    : `${domain.label}: a number is needed, ${permitted}.`;
  throw new OutOfDomainError(domain.input, value, permitted, message, suggestion);
}

/**
 * The same for a count.
 *
 * @throws OutOfDomainError also when the value is no whole number.
 */
export function requireWhole(domain: Domain, value: number): number {
  requireWithin(domain, value);
  if (Number.isInteger(value)) return value;
  const permitted = `a whole number, ${permittedText(domain)}`;
  const message = `${domain.label}: ${value} is no whole number; needed is ${permitted}.`;
  throw new OutOfDomainError(domain.input, value, permitted, message);
}

/**
 * One of a fixed set of words, for a caller that is not checked by the compiler.
 *
 * @throws OutOfDomainError with the set as permitted domain.
 */
export function requireOneOf<Choice extends string | number>(
  { input, label }: Pick<Domain, 'input' | 'label'>,
  choices: readonly Choice[],
  value: Choice,
): Choice {
  if (choices.includes(value)) return value;
  const permitted = `one of ${choices.join(', ')}`;
  throw new OutOfDomainError(input, value, permitted, `${label}: ${String(value)} is not ${permitted}.`);
}

/**
 * A list that must not be empty, nor longer than can be meant.
 *
 * @throws OutOfDomainError otherwise.
 */
export function requireSome(
  { input, label }: Pick<Domain, 'input' | 'label'>,
  items: ArrayLike<unknown>,
  atMost = 1000,
): void {
  if (items.length > 0 && items.length <= atMost) return;
  const permitted = `1 to ${atMost} entries`;
  throw new OutOfDomainError(input, items.length, permitted, `${label}: ${permitted} are needed.`);
}

function isWithin({ above, atLeast, below, atMost }: Domain, value: number): boolean {
  return (
    Number.isFinite(value) &&
    (above === undefined || value > above) &&
    (atLeast === undefined || value >= atLeast) &&
    (below === undefined || value < below) &&
    (atMost === undefined || value <= atMost)
  );
}

function permittedText({ above, atLeast, below, atMost, unit }: Domain): string {
  const bounds = [
    above === undefined ? undefined : `more than ${readable(above)}`,
    atLeast === undefined ? undefined : `at least ${readable(atLeast)}`,
    below === undefined ? undefined : `less than ${readable(below)}`,
    atMost === undefined ? undefined : `at most ${readable(atMost)}`,
  ].filter((bound) => bound !== undefined);
  const range = bounds.length === 0 ? 'any finite number' : bounds.join(' and ');
  return unit === undefined ? range : `${range} ${unit}`;
}

/** A bound that was worked out is said in as many digits as a member can use. */
function readable(bound: number): number {
  return Number.isInteger(bound) ? bound : Number(bound.toPrecision(6));
}

/** A lost decimal point is the usual slip at the bench: 33 typed for 3.3. */
function suggestionFor(domain: Domain, value: number): number | undefined {
  const top = domain.atMost ?? domain.below;
  if (top === undefined || !(value > top)) return undefined;
  const tenth = Number((value / 10).toPrecision(12));
  return isWithin(domain, tenth) ? tenth : undefined;
}
