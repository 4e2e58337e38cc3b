import type { Components, Theme } from '@mui/material/styles';
import { token } from '../../shared-ui/tokens';
import { PHONE } from './typography';

const TALL = { minHeight: 44, [PHONE]: { minHeight: 48 } };

/** Buttons, toggles and ticks: flat, 44 high (48 on a phone), one focus ring everywhere. */
export const controls: Components<Omit<Theme, 'components'>> = {
  MuiButtonBase: {
    defaultProps: { disableRipple: true },
    styleOverrides: {
      root: { '&.Mui-focusVisible': { outline: `2px solid ${token('green')}`, outlineOffset: 1 } },
    },
  },
  MuiButton: {
    defaultProps: { disableElevation: true, variant: 'outlined' },
    styleOverrides: {
      root: {
        ...TALL,
        padding: '8px 16px',
        lineHeight: '20px',
        transition: 'background-color 120ms, color 120ms',
      },
      sizeSmall: { fontSize: '0.8125rem', minHeight: 36, padding: '6px 13px', [PHONE]: { minHeight: 44 } },
      text: { color: token('green'), '&:hover': { color: token('greenDeep') } },
    },
    variants: [
      {
        props: { variant: 'contained', color: 'primary' },
        style: { '&:hover, &:active': { backgroundColor: token('greenDeep') } },
      },
      {
        props: { variant: 'outlined', color: 'primary' },
        style: {
          color: token('ink'),
          borderColor: token('edge'),
          backgroundColor: token('sheet'),
          '&:hover': { borderColor: token('ink'), backgroundColor: token('sunk') },
        },
      },
      {
        props: { variant: 'outlined', color: 'error' },
        style: {
          borderColor: token('oxide'),
          backgroundColor: token('sheet'),
          '&:hover': { borderColor: token('oxide'), backgroundColor: token('oxideTint') },
        },
      },
    ],
  },
  MuiIconButton: {
    styleOverrides: {
      root: {
        borderRadius: 3,
        color: token('ink2'),
        width: 44,
        height: 44,
        '&:hover': { backgroundColor: token('sunk') },
      },
    },
  },
  MuiToggleButtonGroup: { styleOverrides: { root: { backgroundColor: token('sheet') } } },
  MuiToggleButton: {
    styleOverrides: {
      root: {
        ...TALL,
        flex: '1 1 0',
        padding: '4px 12px',
        fontSize: '0.875rem',
        fontWeight: 700,
        textTransform: 'none',
        color: token('ink2'),
        borderColor: token('edge'),
        '&.Mui-selected, &.Mui-selected:hover': { color: token('onGreen'), backgroundColor: token('green') },
      },
    },
  },
  MuiChip: { styleOverrides: { root: { borderRadius: 3 } } },
};
