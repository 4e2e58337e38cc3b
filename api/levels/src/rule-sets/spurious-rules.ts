/** Limits of spurious emissions. */
export type SpuriousRuleId =
  | 'US below 30 MHz'
  | 'US below 30 MHz, before 2003'
  | 'US 30 to 225 MHz'
  | 'ITU below 30 MHz'
  | 'ITU above 30 MHz';

/** A limit: how far a spurious emission must lie below the carrier, as a function of power. */
export interface SpuriousRule {
  source: string;
  /** Which power of the carrier counts. */
  power: 'mean power' | 'peak envelope power';
  /** dB below the carrier for a carrier of so many watts. */
  attenuationDb: (watts: number) => number;
}

const decibels = (ratio: number) => 10 * Math.log10(ratio);

/**
 * The limits offered. ‘Whichever is less stringent’ in the ITU's wording is the smaller attenuation of the two.
 *
 * A transmitter is judged by its carrier: its harmonics above 30 MHz too, when the carrier is below.
 */
export const SPURIOUS_RULES: Readonly<Record<SpuriousRuleId, SpuriousRule>> = {
  'US below 30 MHz': {
    source: '47 CFR 97.307(d), text of 2026-09-23',
    power: 'mean power',
    attenuationDb: () => 43,
  },
  'US below 30 MHz, before 2003': {
    source: '47 CFR 97.307(d), transmitters installed on or before 2003-01-01, text of 2026-09-23',
    power: 'mean power',
    // Never over 50 mW, and 40 dB, or 30 dB under 5 W.
    attenuationDb: (watts) => Math.max(watts < 5 ? 30 : 40, decibels(watts / 0.05)),
  },
  'US 30 to 225 MHz': {
    source: '47 CFR 97.307(e), text of 2026-09-23',
    power: 'mean power',
    // Up to 25 W: at most 25 µW and 40 dB, but never asked to be under 10 µW.
    attenuationDb: (watts) =>
      watts > 25 ? 60 : Math.min(Math.max(40, decibels(watts / 25e-6)), decibels(watts / 10e-6)),
  },
  'ITU below 30 MHz': {
    source:
      'ITU Radio Regulations, Appendix 3, Table I, and Recommendation ITU-R SM.329, category A (from memory)',
    power: 'peak envelope power',
    attenuationDb: (watts) => Math.min(43 + decibels(watts), 50),
  },
  'ITU above 30 MHz': {
    source:
      'ITU Radio Regulations, Appendix 3, Table I, and Recommendation ITU-R SM.329, category A (from memory)',
    power: 'peak envelope power',
    attenuationDb: (watts) => Math.min(43 + decibels(watts), 70),
  },
};
