import { baseUnitsIn } from '@ferrite-row/levels';
import { typedQuantity } from '../../../lib/quantity';
import { isShown, type BenchInputs, type BenchValues, type QuantityInput } from './fields';

export type TypedTexts = Readonly<Record<string, string>>;

/** Either all of them, or why not: words by the name of the input; an input that is only empty has none. */
export type ReadValues<F extends BenchInputs> =
  { isComplete: true; values: BenchValues<F> } | { isComplete: false; problems: TypedTexts };

type Read = { value: number | string | undefined } | { problem?: string };

function readQuantity(input: QuantityInput, text: string): Read {
  const typed = typedQuantity(text, input.unit);
  if (typed.state === 'unclear') return { problem: typed.words };
  if (typed.state === 'read') return { value: inBaseUnits(typed.value, input) };
  return input.isOptional ? { value: undefined } : {};
}

/** 14.2 MHz become 14200000 Hz and not 14199999.999999998. */
const inBaseUnits = (value: number, { unit }: QuantityInput): number =>
  Number((value * baseUnitsIn(unit)).toPrecision(14));

/** What was typed, as the numbers and words a calculation takes. */
export function readValues<F extends BenchInputs>(inputs: F, texts: TypedTexts): ReadValues<F> {
  const read = Object.entries(inputs).map(([name, input]): [string, Read] => {
    const text = isShown(inputs, name, texts) ? (texts[name] ?? input.start) : input.start;
    return [name, input.kind === 'quantity' ? readQuantity(input, text) : { value: text }];
  });
  const open = read.filter(([, one]) => !('value' in one));
  if (open.length > 0) {
    const named = open.flatMap(([name, one]) =>
      'problem' in one && one.problem ? [[name, one.problem]] : [],
    );
    return { isComplete: false, problems: Object.fromEntries(named) as TypedTexts };
  }
  const values = Object.fromEntries(
    read.map(([name, one]) => [name, 'value' in one ? one.value : undefined]),
  );
  // The entries are those of `inputs`, each read by its kind, which is what BenchValues says.
  return { isComplete: true, values: values as BenchValues<F> };
}
