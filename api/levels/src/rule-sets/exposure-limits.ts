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
  power: number;
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

/**
 * Reference levels of the International Commission on Non-Ionizing Radiation Protection for the whole body, as power
 * density: workers, and the general public.
 *
 * Below 30 MHz the guidelines state fields: the density is that of a plane wave with the stricter of the two, and near
 * an antenna each field counts for itself. National limits decide, and may be older or stricter.
 */
export const ICNIRP_EXPOSURE: ExposureLimits = {
  title: 'ICNIRP guidelines of 2020, reference levels for the whole body',
  source: 'Health Physics 118 (2020) 483, Table 5, from memory',
  averagingMinutes: { controlled: 30, uncontrolled: 30 },
  rows: {
    controlled: [
      // 660/f^0.7 V/m over 377 ohm.
      { fromMegahertz: 0.1, toMegahertz: 30, factor: 660 ** 2 / 3770, power: -1.4 },
      { fromMegahertz: 30, toMegahertz: 400, factor: 1, power: 0 },
      { fromMegahertz: 400, toMegahertz: 2000, factor: 1 / 400, power: 1 },
      { fromMegahertz: 2000, toMegahertz: 300_000, factor: 5, power: 0 },
    ],
    uncontrolled: [
      // 300/f^0.7 V/m; from 29.6 MHz on 2.2/f A/m is the stricter.
      { fromMegahertz: 0.1, toMegahertz: 29.6, factor: 300 ** 2 / 3770, power: -1.4 },
      { fromMegahertz: 29.6, toMegahertz: 30, factor: 37.7 * 2.2 ** 2, power: -2 },
      { fromMegahertz: 30, toMegahertz: 400, factor: 0.2, power: 0 },
      { fromMegahertz: 400, toMegahertz: 2000, factor: 1 / 2000, power: 1 },
      { fromMegahertz: 2000, toMegahertz: 300_000, factor: 1, power: 0 },
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
