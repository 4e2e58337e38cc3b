import MenuItem from '@mui/material/MenuItem';
import MuiTextField from '@mui/material/TextField';
import type { ReactNode } from 'react';
import { Icon } from '../icon';
import { StateMark } from '../states/shape';
import { hintLine } from './hint-line';

export interface MultiSelectFieldProps {
  label: string;
  values: readonly string[];
  options: readonly { value: string; label: string }[];
  /** What the closed field says of the chosen ones: "1 to 4". */
  words: string;
  onChange: (values: string[]) => void;
  error?: string;
  hint?: ReactNode;
}

const Chevron = ({ className }: { className?: string }) => (
  <span className={className} style={{ top: 'calc(50% - 8px)', right: 10, lineHeight: 0 }}>
    <Icon name="down" size={16} />
  </span>
);

/** Several of a list: each row is ticked or not, and the list stays open meanwhile. */
export function MultiSelectField({
  label,
  values,
  options,
  words,
  onChange,
  error,
  hint,
}: MultiSelectFieldProps) {
  const known = values.filter((value) => options.some((option) => option.value === value));
  return (
    <MuiTextField
      select
      label={label}
      value={known}
      error={Boolean(error)}
      helperText={hintLine(error, hint)}
      onChange={(event) => onChange(event.target.value as unknown as string[])}
      slotProps={{
        select: { multiple: true, displayEmpty: true, IconComponent: Chevron, renderValue: () => words },
      }}
    >
      {options.map(({ value, label: name }) => (
        <MenuItem key={value} value={value} sx={{ gap: '8px', whiteSpace: 'normal' }}>
          <StateMark name={known.includes(value) ? 'tick' : 'ring'} size={14} />
          {name}
        </MenuItem>
      ))}
    </MuiTextField>
  );
}
