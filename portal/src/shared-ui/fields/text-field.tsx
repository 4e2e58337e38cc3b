import InputAdornment from '@mui/material/InputAdornment';
import MuiTextField from '@mui/material/TextField';
import type { ChangeEvent, HTMLInputAutoCompleteAttribute, ReactNode, Ref } from 'react';
import { hintLine } from './hint-line';
import { roomWords, tooLongWords } from './text-length';

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
  /** Never cut: what is too long is said, and counted. */
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
  const fault = error ?? tooLongWords(rest.value, maxLength);
  return (
    <MuiTextField
      {...rest}
      onChange={(event: ChangeEvent<HTMLInputElement>) => onChange(event.target.value)}
      error={Boolean(fault)}
      helperText={hintLine(fault, roomWords(rest.value, maxLength) ?? hint)}
      multiline={rows !== undefined}
      minRows={rows}
      slotProps={{
        htmlInput: { inputMode },
        input: end ? { endAdornment: <InputAdornment position="end">{end}</InputAdornment> } : undefined,
        inputLabel: { required: false },
      }}
    />
  );
}
