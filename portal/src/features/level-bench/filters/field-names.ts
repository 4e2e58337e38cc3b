import { OutOfDomainError } from '@ferrite-row/levels';

/**
 * Runs a calculation whose inputs have other names there than on the page: what it throws bears the page's name.
 * @param names - the page's name by the calculation's.
 */
export function named<R>(names: Readonly<Record<string, string>>, work: () => R): R {
  try {
    return work();
  } catch (error) {
    if (!(error instanceof OutOfDomainError)) throw error;
    const { input, value, permitted, message, suggestion } = error;
    throw new OutOfDomainError(names[input] ?? input, value, permitted, message, suggestion);
  }
}

/** An error for a field of the page, in its own words and units: "Part tolerance: needed is 0 to 50 %." */
export const outside = (input: string, label: string, value: number, permitted: string): OutOfDomainError =>
  new OutOfDomainError(input, value, permitted, `${label}: needed is ${permitted}.`);
