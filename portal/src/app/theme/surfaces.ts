import type { Components, Theme } from '@mui/material/styles';
import { token } from '../../shared-ui/tokens';

const FOCUS = {
  outline: `2px solid ${token('green')}`,
  outlineOffset: 1,
};

const opened = {
  border: `1.5px solid ${token('ink')}`,
  backgroundColor: token('sheet'),
  backgroundImage: 'none',
};

/** Page, sheets and everything that opens: no shadow, depth is a border and the ground under it. */
export const surfaces: Components<Omit<Theme, 'components'>> = {
  MuiCssBaseline: {
    styleOverrides: {
      html: { colorScheme: 'light', '&[data-theme="dark"]': { colorScheme: 'dark' } },
      body: {
        fontFeatureSettings: '"tnum" 1, "kern" 1',
        backgroundColor: token('paper'),
        color: token('ink'),
        overflowWrap: 'break-word',
      },
      ':focus-visible': FOCUS,
      'b, strong': { fontWeight: 700 },
      'button, input, select, textarea': { font: 'inherit' },
      '@media (prefers-reduced-motion: reduce)': {
        '*, *::before, *::after': { animation: 'none !important', transition: 'none !important' },
      },
    },
  },
  MuiPaper: {
    defaultProps: { elevation: 0 },
    styleOverrides: { root: { backgroundImage: 'none', backgroundColor: token('sheet') } },
  },
  MuiBackdrop: {
    styleOverrides: {
      root: {
        '&:not(.MuiBackdrop-invisible)': {
          backgroundColor: `color-mix(in srgb, ${token('paper')} 60%, transparent)`,
        },
      },
    },
  },
  MuiDialog: { styleOverrides: { paper: { ...opened, margin: 16 } } },
  MuiDialogTitle: {
    styleOverrides: { root: { fontSize: '1.125rem', fontWeight: 700, padding: '18px 20px 4px' } },
  },
  MuiDialogContent: { styleOverrides: { root: { padding: '4px 20px 16px' } } },
  MuiDialogActions: { styleOverrides: { root: { padding: '0 20px 18px', justifyContent: 'flex-start' } } },
  MuiMenu: { styleOverrides: { paper: { border: `1px solid ${token('edge')}` } } },
  MuiMenuItem: {
    styleOverrides: { root: { minHeight: 44, '&.Mui-selected': { backgroundColor: token('greenTint') } } },
  },
  MuiPopover: { styleOverrides: { paper: { border: `1px solid ${token('edge')}` } } },
  MuiTooltip: {
    styleOverrides: {
      tooltip: {
        backgroundColor: token('ink'),
        color: token('paper'),
        borderRadius: 3,
        fontSize: '0.78125rem',
      },
    },
  },
  MuiLink: {
    defaultProps: { underline: 'none' },
    styleOverrides: {
      root: {
        fontWeight: 700,
        color: token('green'),
        borderBottom: '1px solid currentColor',
        '&:hover': { color: token('greenDeep'), borderBottomWidth: 2 },
      },
    },
  },
  MuiTypography: {
    defaultProps: {
      variantMapping: {
        display: 'h1',
        reading: 'span',
        value: 'span',
        small: 'span',
        least: 'span',
        label: 'span',
        tag: 'span',
      },
    },
  },
};
