import { AskingError, LevelsError, readQuantity, type QuantityUnit } from '@ferrite-row/levels';

/** What a field's text means. Its words are fit to stand under the field. */
export type TypedQuantity =
  | { state: 'empty' }
  | { state: 'read'; value: number; understoodAs?: string }
  | { state: 'unclear'; words: string; candidates: readonly string[] };

/**
 * Reads a typed quantity without throwing.
 * @example typedQuantity('4.7k', 'ohm') //=> { state: 'read', value: 4700, understoodAs: '4,700 ohm' }
 */
export function typedQuantity(text: string, unit: QuantityUnit, input?: string): TypedQuantity {
  if (text.trim() === '') return { state: 'empty' };
  try {
    return { state: 'read', ...readQuantity(text, unit, input) };
  } catch (error) {
    if (!(error instanceof LevelsError)) throw error;
    return {
      state: 'unclear',
      words: error.message,
      candidates: error instanceof AskingError ? error.candidates : [],
    };
  }
}
