import type { BenchInputs } from './fields';
import type { TypedTexts } from './read-values';

/** What an address says of the inputs; a choice it does not know and a name that is no input are left out. */
export function textsOf(inputs: BenchInputs, search: string): TypedTexts {
  const query = new URLSearchParams(search);
  const known = Object.entries(inputs).flatMap(([name, input]) => {
    const text = query.get(name);
    if (text === null) return [];
    if (input.kind === 'choice' && !input.options.some(({ value }) => value === text)) return [];
    return [[name, text.slice(0, input.kind === 'words' ? input.longest : LONGEST)]];
  });
  return Object.fromEntries(known) as TypedTexts;
}

/** Longer than any quantity: what is cut off is no quantity either way. */
const LONGEST = 200;

/** The query of an address for what was typed; what stands as it started is left out. */
export function searchOf(inputs: BenchInputs, texts: TypedTexts): string {
  const changed = Object.entries(inputs).flatMap(([name, { start }]) => {
    const text = texts[name];
    return text === undefined || text === start ? [] : [[name, text]];
  });
  return new URLSearchParams(changed).toString();
}
