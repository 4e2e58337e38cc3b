import InputAdornment from '@mui/material/InputAdornment';
import MuiTextField from '@mui/material/TextField';
import type { ChangeEvent, HTMLInputAutoCompleteAttribute, ReactNode, Ref } from 'react';
import { hintLine } from './hint-line';

export interface TextFieldProps {
  label: string;
  value: string;
  onChange: (text: string) => void;
  onBlur?: () => void;
  name?: string;
  type?: 'text' | 'email' | 'password' | 'date' | 'search' | 'number';
  error?: string;
  hint?: ReactNode;
  /** Inside the field behind a hairline: a unit, a length of time, a button. */
  end?: ReactNode;
  rows?: number;
  maxLength?: number;
  autoComplete?: HTMLInputAutoCompleteAttribute;
  inputMode?: 'text' | 'decimal' | 'numeric' | 'email';
  autoFocus?: boolean;
  disabled?: boolean;
  required?: boolean;
  placeholder?: string;
  inputRef?: Ref<HTMLInputElement>;
}

/** A field with its label above it. Errors take the place of the hint and carry the octagon. */
export function TextField({
  onChange,
  error,
  hint,
  end,
  rows,
  maxLength,
  inputMode,
  ...rest
}: TextFieldProps) {
  return (
    <MuiTextField
      {...rest}
      onChange={(event: ChangeEvent<HTMLInputElement>) => onChange(event.target.value)}
      error={Boolean(error)}
      helperText={hintLine(error, hint)}
      multiline={rows !== undefined}
      minRows={rows}
      slotProps={{
        htmlInput: { maxLength, inputMode },
        input: end ? { endAdornment: <InputAdornment position="end">{end}</InputAdornment> } : undefined,
        inputLabel: { required: false },
      }}
    />
  );
}
