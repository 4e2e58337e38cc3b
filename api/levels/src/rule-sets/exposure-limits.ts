/** Who may be there: trained people who know of it, or everybody else. */
export type ExposureTier = 'controlled' | 'uncontrolled';

/** One row of a table of limits: power density of a plane wave, as a power of the frequency. */
export interface ExposureRow {
  /** MHz, included. */
  fromMegahertz: number;
  /** MHz, not included but in the last row. */
  toMegahertz: number;
  /** mW/cm² = factor · f^power, f in MHz. */
  factor: number;
  power: -2 | 0 | 1;
}

/** Limits of a rule, and over how long they are averaged. */
export interface ExposureLimits {
  title: string;
  source: string;
  rows: Readonly<Record<ExposureTier, readonly ExposureRow[]>>;
  averagingMinutes: Readonly<Record<ExposureTier, number>>;
}

/**
 * Limits of the United States for maximum permissible exposure, as power density.
 *
 * Below 30 MHz they stand for a plane wave; near an antenna the electric and magnetic fields have limits of their own.
 */
export const US_EXPOSURE: ExposureLimits = {
  title: 'United States, maximum permissible exposure',
  source: '47 CFR 1.1310(e)(1), Table 1, text of 2026-09-23',
  averagingMinutes: { controlled: 6, uncontrolled: 30 },
  rows: {
    controlled: [
      { fromMegahertz: 0.3, toMegahertz: 3, factor: 100, power: 0 },
      { fromMegahertz: 3, toMegahertz: 30, factor: 900, power: -2 },
      { fromMegahertz: 30, toMegahertz: 300, factor: 1, power: 0 },
      { fromMegahertz: 300, toMegahertz: 1500, factor: 1 / 300, power: 1 },
      { fromMegahertz: 1500, toMegahertz: 100_000, factor: 5, power: 0 },
    ],
    uncontrolled: [
      { fromMegahertz: 0.3, toMegahertz: 1.34, factor: 100, power: 0 },
      { fromMegahertz: 1.34, toMegahertz: 30, factor: 180, power: -2 },
      { fromMegahertz: 30, toMegahertz: 300, factor: 0.2, power: 0 },
      { fromMegahertz: 300, toMegahertz: 1500, factor: 1 / 1500, power: 1 },
      { fromMegahertz: 1500, toMegahertz: 100_000, factor: 1, power: 0 },
    ],
  },
};

/** Average over peak envelope power while transmitting. OET Bulletin 65, Supplement B (1997), Table 2. */
export const MODE_DUTY = {
  'conversational SSB, no processing': 0.2,
  'conversational SSB, heavy processing': 0.5,
  'voice FM': 1,
  'FSK or RTTY': 1,
  'AFSK on SSB': 1,
  'conversational CW': 0.4,
  carrier: 1,
} as const;
