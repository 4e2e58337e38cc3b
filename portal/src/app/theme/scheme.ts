/** Where this device's choice of light, dark or system is kept; `public/theme-init.js` reads the same keys. */
export const SCHEME_KEY = 'ferrite-theme';
export const SCHEME_ATTRIBUTE = 'data-theme';
