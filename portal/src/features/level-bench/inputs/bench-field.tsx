import { useState } from 'react';
import { SelectField } from '../../../shared-ui/fields/select-field';
import { QuantityField } from '../../../shared-ui/fields/quantity-field';
import { ToggleField } from '../../../shared-ui/fields/toggle-field';
import { isShown, type BenchInputs } from './fields';
import type { TypedTexts } from './read-values';
import type { Bench } from './use-bench';

interface BenchFieldProps<F extends BenchInputs> {
  bench: Bench<F>;
  name: keyof F & string;
  problems: TypedTexts;
  /** A choice that opens from its field, however few there are: for half a column. */
  isList?: boolean;
}

/** More choices than this open from a field instead of lying side by side. */
const SIDE_BY_SIDE = 4;

/** One input of a page: a quantity, or a choice with all of it in sight when it is small. */
export function BenchField<F extends BenchInputs>({
  bench,
  name,
  problems,
  isList = false,
}: BenchFieldProps<F>) {
  const [isTyping, setIsTyping] = useState(false);
  const input = bench.inputs[name];
  if (!input || !isShown(bench.inputs, name, bench.texts)) return null;
  const common = { label: input.label, value: bench.texts[name] ?? input.start, hint: input.hint };
  const type = (text: string) => bench.type(name, text);
  if (input.kind === 'quantity') {
    return (
      <QuantityField
        {...common}
        unit={input.unit}
        unitWords={input.unitWords}
        name={name}
        onChange={(text) => {
          setIsTyping(true);
          type(text);
        }}
        onBlur={() => setIsTyping(false)}
        error={isTyping ? undefined : problems[name]}
      />
    );
  }
  const isWide =
    isList || input.options.length > SIDE_BY_SIDE || input.options.some(({ label }) => label.length > 16);
  const Field = isWide ? SelectField : ToggleField;
  return <Field {...common} onChange={type} error={problems[name]} options={input.options} />;
}
