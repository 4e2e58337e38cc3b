import type { QuantityUnit } from '@ferrite-row/levels';
import { useState, type ReactNode, type Ref } from 'react';
import { typedQuantity, type TypedQuantity } from '../../lib/quantity';
import { usePhone } from '../use-phone';
import { joinUnit, splitTyped } from './phone-unit';
import { TextField } from './text-field';
import { UnitSelect } from './unit-select';

export interface QuantityFieldProps {
  label: string;
  /** The field's own unit: what a number without letters is in. */
  unit: QuantityUnit;
  /** Stands in the unit's place where the trade counts in something else: 'm + n', 'turns'. */
  unitWords?: string;
  /** Exactly as typed; kept so, whatever was understood. */
  value: string;
  onChange: (text: string) => void;
  onBlur?: () => void;
  name?: string;
  /** Outranks what the field itself finds unclear. */
  error?: string;
  hint?: ReactNode;
  /** Where a value came from that nobody typed: 'from the plan'; stands after what was understood. */
  source?: string;
  /** On a phone, whose decimal keyboard has no letters, the unit is chosen among these: `['mV/div', 'V/div']`. */
  phoneUnits?: readonly QuantityUnit[];
  autoFocus?: boolean;
  inputRef?: Ref<HTMLInputElement>;
}

const readAs = (typed: TypedQuantity): string | undefined =>
  typed.state === 'read' && typed.understoodAs ? `Read as ${typed.understoodAs}` : undefined;

/**
 * A quantity typed as people write it (`4.7k`, `20 mV`, `1,5`), its unit inside behind a hairline. What was
 * understood is repeated beneath when it is not plain; what is unclear is asked on leaving the field.
 */
export function QuantityField({
  unit,
  unitWords = unit,
  value,
  onChange,
  onBlur,
  error,
  hint,
  source,
  phoneUnits,
  ...rest
}: QuantityFieldProps) {
  const [wasLeft, setWasLeft] = useState(false);
  const isPhone = usePhone();
  const typed = typedQuantity(value, unit);
  const unclear = wasLeft && typed.state === 'unclear' ? typed.words : undefined;
  const choices = isPhone && phoneUnits ? phoneUnits : undefined;
  const parts = choices ? splitTyped(value, choices, unit) : { number: value, unit };
  return (
    <TextField
      {...rest}
      value={parts.number}
      onChange={(text) => {
        setWasLeft(false);
        onChange(choices ? joinUnit(text, parts.unit, unit) : text);
      }}
      onBlur={() => {
        setWasLeft(true);
        onBlur?.();
      }}
      error={error ?? unclear}
      hint={[readAs(typed), source].filter(Boolean).join(', ') || hint}
      inputMode={isPhone ? 'decimal' : 'text'}
      autoComplete="off"
      end={
        choices ? (
          <UnitSelect
            label={`Unit of ${rest.label}`}
            units={choices}
            value={parts.unit}
            onChange={(next) => onChange(joinUnit(parts.number, next, unit))}
          />
        ) : (
          unitWords
        )
      }
    />
  );
}
