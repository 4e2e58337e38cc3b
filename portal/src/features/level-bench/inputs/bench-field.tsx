import { memo, useState } from 'react';
import { SelectField } from '../../../shared-ui/fields/select-field';
import { QuantityField } from '../../../shared-ui/fields/quantity-field';
import { TextField } from '../../../shared-ui/fields/text-field';
import { ToggleField } from '../../../shared-ui/fields/toggle-field';
import { isShown, type BenchInput, type BenchInputs } from './fields';
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
  const input = bench.inputs[name];
  if (!input || !isShown(bench.inputs, name, bench.texts)) return null;
  const text = bench.texts[name] ?? input.start;
  return <Field {...{ input, name, text, isList }} type={bench.type} problem={problems[name]} />;
}

interface FieldProps {
  input: BenchInput;
  name: string;
  text: string;
  type: (name: string, text: string) => void;
  problem: string | undefined;
  isList: boolean;
}

/** Drawn anew only when its own text or problem changes: a page has twenty, and one of them is typed in. */
const Field = memo(function Field({ input, name, text, type, problem, isList }: FieldProps) {
  const [isTyping, setIsTyping] = useState(false);
  const common = { label: input.label, value: text, hint: input.hint };
  if (input.kind === 'quantity') {
    return (
      <QuantityField
        {...common}
        unit={input.unit}
        unitWords={input.unitWords}
        name={name}
        onChange={(typed) => {
          setIsTyping(true);
          type(name, typed);
        }}
        onBlur={() => setIsTyping(false)}
        error={isTyping ? undefined : problem}
      />
    );
  }
  if (input.kind === 'words') {
    return (
      <TextField
        {...common}
        name={name}
        onChange={(text) => type(name, text)}
        error={problem}
        maxLength={input.longest}
      />
    );
  }
  const isWide =
    isList || input.options.length > SIDE_BY_SIDE || input.options.some(({ label }) => label.length > 16);
  const Choice = isWide ? SelectField : ToggleField;
  return (
    <Choice {...common} onChange={(chosen) => type(name, chosen)} error={problem} options={input.options} />
  );
});
