/**
 * What every error of this package carries, so that a form can put it on its field and a server can answer with it.
 * `message` is fit for a member to read.
 */
export abstract class LevelsError extends Error {
  /**
   * @param input - name of the input as the caller knows it, for example `divisionsPeakToPeak`.
   * @param value - what was given, untouched.
   * @param permitted - the permitted domain in words.
   * @param message - the whole sentence for a member.
   */
  constructor(
    readonly input: string,
    readonly value: unknown,
    readonly permitted: string,
    message: string,
  ) {
    super(message);
  }
}

/** A number outside what its input permits, or no number at all (NaN, infinite). */
export class OutOfDomainError extends LevelsError {
  override readonly name = 'OutOfDomainError';

  /** @param suggestion - the value with its decimal point one place to the left, where that would be permitted. */
  constructor(
    input: string,
    value: unknown,
    permitted: string,
    message: string,
    readonly suggestion?: number,
  ) {
    super(input, value, permitted, message);
  }
}

/** Text that is not a quantity. */
export class UnreadableQuantityError extends LevelsError {
  override readonly name = 'UnreadableQuantityError';
}

/** A quantity that is well written, in a unit of another kind than the one asked for. */
export class WrongUnitError extends LevelsError {
  override readonly name = 'WrongUnitError';
}

/** Text with more than one sensible reading, or with a prefix no bench has: the caller should ask, not guess. */
export class AskingError extends LevelsError {
  override readonly name = 'AskingError';

  /** @param candidates - texts that would be read without a question, likeliest first; may be empty. */
  constructor(
    input: string,
    value: unknown,
    permitted: string,
    message: string,
    readonly candidates: readonly string[],
  ) {
    super(input, value, permitted, message);
  }
}
