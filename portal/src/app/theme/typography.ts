import type { CSSProperties } from 'react';

declare module '@mui/material/styles' {
  interface TypographyVariants {
    display: CSSProperties;
    reading: CSSProperties;
    value: CSSProperties;
    small: CSSProperties;
    least: CSSProperties;
    label: CSSProperties;
    tag: CSSProperties;
  }
  interface TypographyVariantsOptions {
    display?: CSSProperties;
    reading?: CSSProperties;
    value?: CSSProperties;
    small?: CSSProperties;
    least?: CSSProperties;
    label?: CSSProperties;
    tag?: CSSProperties;
  }
}

declare module '@mui/material/Typography' {
  interface TypographyPropsVariantOverrides {
    display: true;
    reading: true;
    value: true;
    small: true;
    least: true;
    label: true;
    tag: true;
    h4: false;
    h5: false;
    h6: false;
    subtitle1: false;
    subtitle2: false;
    overline: false;
  }
}

const FAMILY = "'Merriweather Sans Variable', system-ui, sans-serif";

const px = (size: number, line: number, fontWeight: number) => ({
  fontFamily: FAMILY,
  fontSize: `${size / 16}rem`,
  lineHeight: `${line / 16}rem`,
  fontWeight,
  letterSpacing: 0,
});

export const PHONE = '@media (max-width:899.95px)';

/** Large text is set a little closer. */
const TIGHT = { letterSpacing: '-0.02em' };

/** Sizes in rem, so that a browser's own text size is honoured. Nothing is smaller than `least`. */
export const typography = {
  fontFamily: FAMILY,
  fontWeightLight: 300,
  fontWeightRegular: 400,
  fontWeightMedium: 600,
  fontWeightBold: 700,
  display: { ...px(38, 48, 300), ...TIGHT, [PHONE]: { ...px(29, 38, 300), ...TIGHT } },
  h1: { ...px(31, 40, 300), ...TIGHT, [PHONE]: { ...px(28, 36, 300), ...TIGHT } },
  h2: { ...px(16, 22, 700), ...TIGHT },
  h3: px(13.5, 19, 700),
  reading: { ...px(33, 36, 700), ...TIGHT },
  value: px(15, 21, 600),
  body1: px(14, 21, 400),
  body2: px(12.5, 18, 400),
  small: px(12.5, 18, 400),
  caption: px(12.5, 18, 400),
  least: px(11.5, 16, 600),
  label: px(12, 16, 600),
  tag: { ...px(11.5, 16, 600), letterSpacing: '0.02em' },
  button: { ...px(14, 20, 700), textTransform: 'none' as const },
};
