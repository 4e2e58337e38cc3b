import type { TokenName } from '../../shared-ui/tokens';

declare module '@mui/material/styles' {
  interface Palette {
    copper: Palette['primary'];
    token: Record<TokenName, string>;
  }
  interface PaletteOptions {
    copper?: PaletteOptions['primary'];
    token?: Record<TokenName, string>;
  }
}

const solid = (main: string, dark: string, contrastText: string) => ({
  main,
  dark,
  light: main,
  contrastText,
});

/** MUI's palette from the design's colours; a caution or state colour also carries a shape wherever it is used. */
export function paletteOf(c: Record<TokenName, string>) {
  return {
    primary: solid(c.green, c.greenDeep, c.onGreen),
    secondary: solid(c.ink, c.ink, c.paper),
    success: solid(c.green, c.greenDeep, c.onGreen),
    error: solid(c.oxide, c.oxide, c.paper),
    warning: solid(c.brass, c.brass, c.paper),
    info: solid(c.trace, c.trace, c.paper),
    copper: solid(c.copper, c.copper, c.paper),
    token: c,
    background: { default: c.paper, paper: c.sheet },
    divider: c.rule,
    text: { primary: c.ink, secondary: c.ink2, disabled: c.ink3 },
    action: { hover: c.sunk, active: c.ink2, disabled: c.ink3, disabledBackground: c.sunk },
  };
}
