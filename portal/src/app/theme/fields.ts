import type { Components, Theme } from '@mui/material/styles';
import { token } from '../../shared-ui/tokens';
import { PHONE } from './typography';

/** Fields: the label stands above, the unit inside behind a hairline, the error in place of the hint. */
export const fields: Components<Omit<Theme, 'components'>> = {
  MuiTextField: { defaultProps: { fullWidth: true } },
  MuiFormControl: { styleOverrides: { root: { minWidth: 0 } } },
  MuiFormLabel: {
    styleOverrides: {
      root: {
        color: token('ink2'),
        fontSize: '0.75rem',
        lineHeight: '1rem',
        fontWeight: 600,
        '&.Mui-focused, &.Mui-error': { color: token('ink2') },
      },
    },
  },
  MuiInputLabel: {
    defaultProps: { shrink: true, disableAnimation: true },
    styleOverrides: {
      root: {
        position: 'static',
        transform: 'none',
        marginBottom: 4,
        maxWidth: '100%',
        whiteSpace: 'normal',
      },
    },
  },
  MuiOutlinedInput: {
    defaultProps: { notched: false },
    styleOverrides: {
      root: {
        minHeight: 44,
        fontSize: '0.9375rem',
        fontWeight: 600,
        backgroundColor: token('sheet'),
        [PHONE]: { minHeight: 48, fontSize: '1.0625rem' },
        '&.Mui-focused': { outline: `2px solid ${token('green')}`, outlineOffset: 1 },
        '& .MuiOutlinedInput-notchedOutline, &.Mui-focused .MuiOutlinedInput-notchedOutline': {
          borderColor: token('edge'),
          borderWidth: 1,
          top: 0,
          '& legend': { display: 'none' },
        },
        '&:hover .MuiOutlinedInput-notchedOutline': { borderColor: token('ink2') },
        '&.Mui-focused .MuiOutlinedInput-notchedOutline': { borderColor: token('green') },
        '&.Mui-error .MuiOutlinedInput-notchedOutline': { borderColor: token('oxide'), borderWidth: 2 },
      },
      input: { padding: '10px 12px', height: '1.5rem', '&:focus-visible': { outline: 'none' } },
      multiline: { padding: 0, '& textarea': { padding: '10px 12px', lineHeight: 1.45 } },
    },
  },
  MuiSelect: {
    styleOverrides: {
      select: { '&:focus': { backgroundColor: 'transparent' } },
      icon: { color: token('ink2') },
    },
  },
  MuiInputAdornment: {
    styleOverrides: {
      positionEnd: {
        height: 24,
        maxHeight: 'none',
        paddingLeft: 10,
        borderLeft: `1px solid ${token('rule')}`,
        '& .MuiTypography-root': { fontSize: '0.8125rem', color: token('ink3') },
      },
    },
  },
  MuiFormHelperText: {
    styleOverrides: {
      root: {
        margin: '4px 0 0',
        fontSize: '0.75rem',
        lineHeight: '1rem',
        color: token('ink2'),
        '&.Mui-error': { color: token('oxide') },
      },
    },
  },
};
