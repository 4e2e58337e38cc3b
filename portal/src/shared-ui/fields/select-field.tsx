import MenuItem from '@mui/material/MenuItem';
import MuiTextField from '@mui/material/TextField';
import type { ReactNode, Ref } from 'react';
import { Icon } from '../icon';
import { hintLine } from './hint-line';

interface SelectOption {
  value: string;
  label: ReactNode;
  /** Why it cannot be chosen; shown in the row, which stays visible. */
  unavailable?: string;
}

export interface SelectFieldProps {
  label: string;
  value: string;
  options: readonly SelectOption[];
  onChange: (value: string) => void;
  onBlur?: () => void;
  name?: string;
  error?: string;
  hint?: ReactNode;
  disabled?: boolean;
  inputRef?: Ref<HTMLInputElement>;
}

const Chevron = ({ className }: { className?: string }) => (
  <span className={className} style={{ top: 'calc(50% - 8px)', right: 10, lineHeight: 0 }}>
    <Icon name="down" size={16} />
  </span>
);

export function SelectField({ options, onChange, error, hint, ...rest }: SelectFieldProps) {
  return (
    <MuiTextField
      select
      {...rest}
      onChange={(event) => onChange(event.target.value)}
      error={Boolean(error)}
      helperText={hintLine(error, hint)}
      slotProps={{ select: { IconComponent: Chevron, displayEmpty: true } }}
    >
      {options.map(({ value, label, unavailable }) => (
        <MenuItem
          key={value}
          value={value}
          disabled={unavailable !== undefined}
          sx={{ whiteSpace: 'normal' }}
        >
          {label}
          {unavailable && <>, {unavailable}</>}
        </MenuItem>
      ))}
    </MuiTextField>
  );
}
