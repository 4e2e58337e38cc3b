import type { QuantityUnit } from '@ferrite-row/levels';
import Box from '@mui/material/Box';

interface UnitSelectProps {
  label: string;
  units: readonly QuantityUnit[];
  value: QuantityUnit;
  onChange: (unit: QuantityUnit) => void;
}

/** The device's own select, small inside the field; its target reaches the field's full height. */
export function UnitSelect({ label, units, value, onChange }: UnitSelectProps) {
  return (
    <Box
      component="select"
      aria-label={label}
      value={value}
      onChange={(event) => {
        const next = units.find((unit) => unit === event.target.value);
        if (next) onChange(next);
      }}
      sx={{
        minHeight: 44,
        mr: '-8px',
        border: 0,
        background: 'transparent',
        color: 'token.ink2',
        font: 'inherit',
        fontSize: '0.8125rem',
      }}
    >
      {[...new Set([value, ...units])].map((unit) => (
        <option key={unit} value={unit}>
          {unit}
        </option>
      ))}
    </Box>
  );
}
