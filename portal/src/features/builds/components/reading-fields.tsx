import type { EntryField, QuantityUnit } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import { QuantityField } from '../../../shared-ui/fields/quantity-field';
import { SelectField } from '../../../shared-ui/fields/select-field';
import { ToggleField } from '../../../shared-ui/fields/toggle-field';
import type { ReadingFormState } from '../logic/use-reading-form';
import { sheetWords } from '../logic/sheet-words';

const PHONE_UNITS: Partial<Record<QuantityUnit, readonly QuantityUnit[]>> = {
  'V/div': ['mV/div', 'V/div'],
  's/div': ['ns/div', 'µs/div', 'ms/div'],
  ohm: ['ohm', 'kohm'],
  V: ['V', 'mV'],
  A: ['A', 'mA'],
};

interface ReadingFieldsProps {
  form: ReadingFormState;
  /** Where the load is: 'TP9'. */
  testPoint?: string;
}

/** The fields of a measured check in the order they are read off the instrument, then the instrument itself. */
export function ReadingFields({ form, testPoint }: ReadingFieldsProps) {
  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '1fr 1fr', sm: 'repeat(3, 1fr)' },
        gap: '12px 10px',
        alignItems: 'start',
      }}
    >
      {form.fields.map((field) => (
        <Field key={field.name} field={field} form={form} testPoint={testPoint} />
      ))}
      {form.instruments.length > 0 && (
        <SelectField
          label="Instrument"
          value={form.instrumentId}
          onChange={form.setInstrument}
          error={form.errorOf('instrumentId')}
          hint={form.instrument && sheetWords(form.instrument, form.check)}
          options={form.instruments.map(({ id, tag, reason }) => ({
            value: id,
            label: tag,
            unavailable: reason ?? undefined,
          }))}
        />
      )}
    </Box>
  );
}

function Field({ field, form, testPoint }: ReadingFieldsProps & { field: EntryField }) {
  const { name, unit, choices } = field;
  const label = name === 'loadOhms' && testPoint ? `Load at ${testPoint}` : field.label;
  const value = form.entry[name] ?? '';
  if (choices)
    return (
      <ToggleField
        label={label}
        value={value}
        options={choices.map((choice) => ({ value: String(choice), label: `×${choice}` }))}
        onChange={(next) => form.setEntry(name, next)}
        error={form.errorOf(name)}
        hint={form.sourceOf(name)}
      />
    );
  return (
    <QuantityField
      label={label}
      unit={unit}
      value={value}
      onChange={(text) => form.setEntry(name, text)}
      onBlur={() => form.leave(name)}
      error={form.errorOf(name)}
      phoneUnits={PHONE_UNITS[unit]}
      source={form.sourceOf(name)}
    />
  );
}
