import { memo } from 'react';
import { BenchField } from './bench-field';
import { isShown, type BenchInputs } from './fields';
import type { TypedTexts } from './read-values';
import type { Bench } from './use-bench';

interface SteadyFieldProps<F extends BenchInputs> {
  bench: Bench<F>;
  name: keyof F & string;
  problems: TypedTexts;
}

/** A field that is drawn again only when something of its own has changed: a page of many fields is not, with every key. */
export const SteadyField = memo(BenchField, (before, after) => {
  const { bench, name, problems } = before;
  return (
    name === after.name &&
    bench.inputs === after.bench.inputs &&
    bench.texts[name] === after.bench.texts[name] &&
    problems[name] === after.problems[name] &&
    isShown(bench.inputs, name, bench.texts) === isShown(bench.inputs, name, after.bench.texts)
  );
}) as <F extends BenchInputs>(props: SteadyFieldProps<F>) => ReturnType<typeof BenchField>;
