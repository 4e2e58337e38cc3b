import Box from '@mui/material/Box';
import { useState } from 'react';
import { useController, type Control } from 'react-hook-form';
import { TextField } from '../../../shared-ui/fields/text-field';
import { Icon } from '../../../shared-ui/icon';
import type { SignInFields } from './sign-in-fields';

/** The password, hidden until its eye is pressed. */
export function PasswordField({ control }: { control: Control<SignInFields> }) {
  const [isShown, setIsShown] = useState(false);
  const { field, fieldState } = useController({
    control,
    name: 'password',
    rules: { required: 'Type your password' },
  });
  const { ref, ...bound } = field;
  return (
    <TextField
      {...bound}
      inputRef={ref}
      label="Password"
      type={isShown ? 'text' : 'password'}
      autoComplete="current-password"
      maxLength={200}
      error={fieldState.error?.message}
      end={
        <Box
          component="button"
          type="button"
          aria-label="Show the password"
          aria-pressed={isShown}
          onClick={() => setIsShown(!isShown)}
          sx={{
            display: 'grid',
            placeItems: 'center',
            width: 44,
            height: 44,
            mr: '-12px',
            p: 0,
            border: 0,
            background: 'none',
            color: 'token.ink3',
            cursor: 'pointer',
          }}
        >
          <Icon name={isShown ? 'eyeShut' : 'eye'} size={18} />
        </Box>
      }
    />
  );
}
