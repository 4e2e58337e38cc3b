/** Units a field can ask for, without prefix. */
export type BaseUnit =
  | 'V'
  | 'A'
  | 'W'
  | 'ohm'
  | 'Hz'
  | 's'
  | 'F'
  | 'H'
  | 'V/div'
  | 's/div'
  | 'dB'
  | 'dBm'
  | 'dBc'
  | 'dB/div'
  | 'div'
  | 'ppm'
  | '%'
  | 'm'
  | 'min'
  | '°C'
  | 'K/W'
  /** A plain number: a count, a ratio. */
  | '';

/** Prefixes that a field's own unit may carry. */
export type Prefix = 'p' | 'n' | 'µ' | 'm' | 'k' | 'M' | 'G';

/** Unit of a field: a mA field asks for `mA` and gets milliamperes. */
export type QuantityUnit =
  BaseUnit | `${Prefix}${'V' | 'A' | 'W' | 'ohm' | 'Hz' | 's' | 'F' | 'H' | 'm' | 'V/div' | 's/div'}`;

/** Powers of ten (SI brochure, table of prefixes). */
export const PREFIX_EXPONENT: Record<Prefix, number> = { p: -12, n: -9, µ: -6, m: -3, k: 3, M: 6, G: 9 };

interface BaseUnitFacts {
  /** How people write it, lower case. */
  spellings: readonly string[];
  /** Prefixes a bench has for it; any other is asked about. What a bench has is common practice. */
  prefixes: readonly Prefix[];
}

/** Longest names first, so that a reader may stop at the first match. */
export const BASE_UNITS: Record<BaseUnit, BaseUnitFacts> = {
  'V/div': { spellings: ['v/div', 'v', 'v/d'], prefixes: ['µ', 'm'] },
  's/div': { spellings: ['s/div', 's', 's/d', 'sec/div'], prefixes: ['n', 'µ', 'm'] },
  'dB/div': { spellings: ['db/div', 'db', 'db/d'], prefixes: [] },
  dBm: { spellings: ['dbm'], prefixes: [] },
  dBc: { spellings: ['dbc', 'db'], prefixes: [] },
  dB: { spellings: ['db'], prefixes: [] },
  ohm: { spellings: ['ohm', 'ohms', 'r'], prefixes: ['m', 'k', 'M', 'G'] },
  Hz: { spellings: ['hz'], prefixes: ['k', 'M', 'G'] },
  div: { spellings: ['div', 'divs', 'divisions', 'd'], prefixes: [] },
  ppm: { spellings: ['ppm'], prefixes: [] },
  '%': { spellings: ['%', 'percent'], prefixes: [] },
  V: { spellings: ['v', 'volt', 'volts'], prefixes: ['µ', 'm', 'k'] },
  A: { spellings: ['a', 'amp', 'amps'], prefixes: ['n', 'µ', 'm'] },
  W: { spellings: ['w', 'watt', 'watts'], prefixes: ['p', 'n', 'µ', 'm', 'k'] },
  s: { spellings: ['s', 'sec'], prefixes: ['n', 'µ', 'm'] },
  F: { spellings: ['f'], prefixes: ['p', 'n', 'µ', 'm'] },
  H: { spellings: ['h'], prefixes: ['n', 'µ', 'm'] },
  min: { spellings: ['min', 'minutes'], prefixes: [] },
  m: { spellings: ['m', 'metre', 'metres'], prefixes: ['µ', 'm'] },
  '°C': { spellings: ['°c', 'c', 'degc'], prefixes: [] },
  'K/W': { spellings: ['k/w', '°c/w', 'c/w'], prefixes: [] },
  '': { spellings: [], prefixes: [] },
};

/**
 * One of a unit in its base unit: 1e6 for MHz, 0.01 for per cent, 60 for minutes. Degrees Celsius stay as they are.
 * @example baseUnitsIn('MHz') //=> 1000000
 * @example baseUnitsIn('%') //=> 0.01
 */
export function baseUnitsIn(unit: QuantityUnit): number {
  const { prefix, base } = splitUnit(unit);
  if (base === '%') return 0.01;
  if (base === 'ppm') return 1e-6;
  if (base === 'min') return 60;
  return prefix === undefined ? 1 : Number(`1e${PREFIX_EXPONENT[prefix]}`);
}

/**
 * Prefix and base of a field's unit.
 */
export function splitUnit(unit: QuantityUnit): { prefix?: Prefix; base: BaseUnit } {
  if (isBaseUnit(unit)) return { base: unit };
  // The type leaves nothing else: one prefix letter, then a base unit.
  return { prefix: unit.slice(0, 1) as Prefix, base: unit.slice(1) as BaseUnit };
}

function isBaseUnit(unit: string): unit is BaseUnit {
  return unit in BASE_UNITS;
}

/** The prefix a letter stands for; K is written for kilo so often that it is read as such. */
export function prefixOf(letter: string): Prefix | undefined {
  if (letter === 'u') return 'µ';
  if (letter === 'K') return 'k';
  return letter in PREFIX_EXPONENT ? (letter as Prefix) : undefined;
}
