import { OutOfDomainError } from '@ferrite-row/levels';

/**
 * Works something out; what is refused stands at the page's own field where that is called otherwise than in the
 * levels package.
 * @param names - the page's name by the package's.
 * @example atField({ henries: 'coilHenries' }, () => singleLayerTurns(coil, coilHenries))
 */
export function atField<T>(names: Readonly<Record<string, string>>, work: () => T): T {
  try {
    return work();
  } catch (error) {
    if (!(error instanceof OutOfDomainError)) throw error;
    const { input, value, permitted, message, suggestion } = error;
    throw new OutOfDomainError(names[input] ?? input, value, permitted, message, suggestion);
  }
}
