import { createTheme } from '@mui/material/styles';
import type { Shadows } from '@mui/material/styles';
import { DARK, LIGHT } from './colours';
import { controls } from './controls';
import { fields } from './fields';
import { paletteOf } from './palette';
import { SCHEME_ATTRIBUTE } from './scheme';
import { surfaces } from './surfaces';
import { typography } from './typography';

const flat = Array.from({ length: 25 }, () => 'none') as Shadows;

export const theme = createTheme({
  cssVariables: { cssVarPrefix: 'fr', colorSchemeSelector: SCHEME_ATTRIBUTE },
  colorSchemes: {
    light: { palette: paletteOf(LIGHT) },
    dark: { palette: paletteOf(DARK), overlays: Array.from({ length: 25 }, () => 'none') as never },
  },
  breakpoints: { values: { xs: 0, sm: 600, md: 900, lg: 1200, xl: 1536 } },
  spacing: 4,
  shape: { borderRadius: 3 },
  shadows: flat,
  typography,
  transitions: {
    duration: {
      shortest: 120,
      shorter: 120,
      short: 120,
      standard: 120,
      complex: 120,
      enteringScreen: 120,
      leavingScreen: 120,
    },
  },
  components: { ...surfaces, ...controls, ...fields },
});
