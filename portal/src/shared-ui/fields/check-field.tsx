import Box from '@mui/material/Box';
import Checkbox from '@mui/material/Checkbox';
import { useId, type ReactNode, type Ref } from 'react';
import { Icon } from '../icon';
import { token } from '../tokens';
import { hintLine } from './hint-line';

const box = (isChecked: boolean) => (
  <svg width="20" height="20" viewBox="0 0 20 20" fill="none" aria-hidden>
    <rect
      x="1.5"
      y="1.5"
      width="17"
      height="17"
      rx="2"
      fill={isChecked ? token('green') : token('sheet')}
      stroke={isChecked ? token('green') : token('edge')}
    />
    {isChecked && (
      <path d="M5.5 10.3l3 3 6-6.6" stroke={token('onGreen')} strokeWidth="2" strokeLinecap="round" />
    )}
  </svg>
);

export interface CheckFieldProps {
  label: ReactNode;
  /** A second line under the label. */
  hint?: ReactNode;
  error?: string;
  checked: boolean;
  onChange: (checked: boolean) => void;
  onBlur?: () => void;
  name?: string;
  /** Cannot be ticked now: a padlock stands in the box's place, and the hint says why. */
  unavailable?: boolean;
  inputRef?: Ref<HTMLInputElement>;
}

/** A tick with its words; the whole row is the target. */
export function CheckField({
  label,
  hint,
  error,
  onChange,
  unavailable = false,
  inputRef,
  ...rest
}: CheckFieldProps) {
  const id = useId();
  return (
    <Box
      component="label"
      sx={{
        display: 'flex',
        alignItems: 'flex-start',
        minHeight: 44,
        cursor: unavailable ? 'default' : 'pointer',
      }}
    >
      <Checkbox
        {...rest}
        disabled={unavailable}
        onChange={(_event, checked) => onChange(checked)}
        icon={unavailable ? <Icon name="lock" size={20} /> : box(false)}
        checkedIcon={box(true)}
        slotProps={{ input: { ref: inputRef, 'aria-describedby': id } }}
        sx={{ p: '12px', ml: '-12px', my: '-1px' }}
      />
      <Box component="span" sx={{ pt: '11px', lineHeight: '1.25rem' }}>
        <Box
          component="span"
          sx={{ display: 'block', fontWeight: 700, color: unavailable ? 'token.ink3' : 'token.ink' }}
        >
          {label}
        </Box>
        <Box
          component="span"
          id={id}
          sx={{ typography: 'small', color: error ? 'token.oxide' : 'token.ink2' }}
        >
          {hintLine(error, hint)}
        </Box>
      </Box>
    </Box>
  );
}
