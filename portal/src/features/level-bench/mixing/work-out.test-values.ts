import { readValues } from '../inputs/read-values';
import { INPUTS, type MixingValues } from './inputs';

/** The page as it opens, with what is typed over. */
export function valuesWith(texts: Record<string, string> = {}): MixingValues {
  const read = readValues(INPUTS, texts);
  if (!read.isComplete) throw new Error(JSON.stringify(read.problems));
  return read.values;
}
