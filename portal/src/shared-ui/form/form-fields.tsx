import type { Control, FieldPathByValue, FieldValues, RegisterOptions } from 'react-hook-form';
import { useController } from 'react-hook-form';
import { CheckField, type CheckFieldProps } from '../fields/check-field';
import { SelectField, type SelectFieldProps } from '../fields/select-field';
import { TextField, type TextFieldProps } from '../fields/text-field';
import { ToggleField, type ToggleFieldProps } from '../fields/toggle-field';

interface Bound<T extends FieldValues, V> {
  control: Control<T>;
  name: FieldPathByValue<T, V>;
  rules?: Omit<
    RegisterOptions<T, FieldPathByValue<T, V>>,
    'valueAsNumber' | 'valueAsDate' | 'setValueAs' | 'disabled'
  >;
}

type Own<P> = Omit<P, 'value' | 'checked' | 'onChange' | 'onBlur' | 'name' | 'error' | 'inputRef'>;

/** One field redraws itself on a keystroke, never the whole form. */
export function FormText<T extends FieldValues>({
  control,
  name,
  rules,
  ...own
}: Bound<T, string> & Own<TextFieldProps>) {
  const { field, fieldState } = useController({ control, name, rules });
  const { ref, ...bound } = field;
  return <TextField {...own} {...bound} inputRef={ref} error={fieldState.error?.message} />;
}

export function FormSelect<T extends FieldValues>(props: Bound<T, string> & Own<SelectFieldProps>) {
  const { control, name, rules, ...own } = props;
  const { field, fieldState } = useController({ control, name, rules });
  const { ref, ...bound } = field;
  return <SelectField {...own} {...bound} inputRef={ref} error={fieldState.error?.message} />;
}

export function FormToggle<T extends FieldValues>(props: Bound<T, string> & Own<ToggleFieldProps<string>>) {
  const { control, name, rules, ...own } = props;
  const { field, fieldState } = useController({ control, name, rules });
  return (
    <ToggleField {...own} value={field.value} onChange={field.onChange} error={fieldState.error?.message} />
  );
}

export function FormCheck<T extends FieldValues>(props: Bound<T, boolean> & Own<CheckFieldProps>) {
  const { control, name, rules, ...own } = props;
  const { field, fieldState } = useController({ control, name, rules });
  const { ref, value, ...bound } = field;
  return <CheckField {...own} {...bound} checked={value} inputRef={ref} error={fieldState.error?.message} />;
}
