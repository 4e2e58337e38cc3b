import FormControl from '@mui/material/FormControl';
import FormHelperText from '@mui/material/FormHelperText';
import FormLabel from '@mui/material/FormLabel';
import ToggleButton from '@mui/material/ToggleButton';
import ToggleButtonGroup from '@mui/material/ToggleButtonGroup';
import { useId, type ReactNode } from 'react';
import { hintLine } from './hint-line';

export interface ToggleFieldProps<T extends string> {
  label: string;
  value: T;
  options: readonly { value: T; label: ReactNode }[];
  onChange: (value: T) => void;
  error?: string;
  hint?: ReactNode;
}

/** A choice among two to four, all in sight: probe ×1 or ×10. */
export function ToggleField<T extends string>({
  label,
  value,
  options,
  onChange,
  error,
  hint,
}: ToggleFieldProps<T>) {
  const id = useId();
  const line = hintLine(error, hint);
  return (
    <FormControl fullWidth error={Boolean(error)}>
      <FormLabel id={id} sx={{ mb: '4px' }}>
        {label}
      </FormLabel>
      <ToggleButtonGroup
        exclusive
        fullWidth
        aria-labelledby={id}
        value={value}
        onChange={(_event, next: T | null) => next !== null && onChange(next)}
      >
        {options.map((option) => (
          <ToggleButton key={option.value} value={option.value}>
            {option.label}
          </ToggleButton>
        ))}
      </ToggleButtonGroup>
      {line && <FormHelperText>{line}</FormHelperText>}
    </FormControl>
  );
}
