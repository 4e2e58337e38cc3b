/** Names of the design's colours; their values for light and dark are in `app/theme/colours.ts`. */
export type TokenName =
  | 'paper'
  | 'sheet'
  | 'sunk'
  | 'ink'
  | 'ink2'
  | 'ink3'
  | 'rule'
  | 'edge'
  | 'green'
  | 'greenDeep'
  | 'onGreen'
  | 'copper'
  | 'brass'
  | 'brassFill'
  | 'oxide'
  | 'trace'
  | 'greenTint'
  | 'copperTint'
  | 'brassTint'
  | 'oxideTint'
  | 'traceTint';

/**
 * The CSS variable of a colour, for SVG attributes and style rules: it follows light and dark by itself.
 *
 * In `sx` the same colour is `'token.copper'`.
 * @example <path stroke={token('green')} />
 */
export const token = (name: TokenName): string => `var(--fr-palette-token-${name})`;
