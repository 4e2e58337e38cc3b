import {
  dB,
  dBm,
  hertz,
  judgeSpurs,
  spuriousLimit,
  wattsFromDbm,
  type SpuriousLimit,
} from '@ferrite-row/levels';
import { fixed } from '../../../lib/text';
import type { Carrier } from './carrier';
import { named } from './field-names';
import type { FilterValues } from './inputs';

/** How much must be taken somewhere, against the carrier. */
export interface Limit {
  /** "second harmonic". */
  name: string;
  hertz: number;
  neededDb: number;
}

/** What the filter is held against. */
export interface Limits {
  limits: Limit[];
  carrierWatts: number;
  /** The rule; none for a high-pass, which lets harmonics through. */
  rule?: SpuriousLimit;
}

const HARMONICS = [
  { harmonic: 2, name: 'second harmonic', input: 'secondDbc' },
  { harmonic: 3, name: 'third harmonic', input: 'thirdDbc' },
  { harmonic: 4, name: 'fourth harmonic', input: 'fourthDbc' },
] as const;

/**
 * What must be taken, by rising frequency. Harmonics are those of the band's low end, where a filter takes least of
 * them; what was measured before the filter need not be taken again.
 */
export function limitsOf(values: FilterValues, { lowHertz }: Carrier): Limits {
  const carrierWatts = wattsFromDbm(dBm(values.powerDbm, 'powerDbm'));
  if (values.kind === 'high-pass') {
    const unwanted = {
      name: 'unwanted',
      hertz: hertz(values.unwantedHertz, 'unwantedHertz'),
      neededDb: dB(values.unwantedDb, 'unwantedDb'),
    };
    return { limits: [unwanted], carrierWatts };
  }
  const rule = named({ carrierWatts: 'powerDbm' }, () => spuriousLimit(values.rule, carrierWatts));
  const expandedUncertaintyDb = values.spurUncertaintyDb ?? 0;
  const limits = HARMONICS.map(({ harmonic, name, input }) => {
    const [spur] = named({ dbc: input, expandedUncertainty: 'spurUncertaintyDb' }, () =>
      judgeSpurs(rule, [{ harmonic, dbc: values[input], expandedUncertaintyDb }]),
    );
    return { name, hertz: harmonic * lowHertz, neededDb: spur?.neededDb ?? 0 };
  });
  return { limits, carrierWatts, rule };
}

const watts = (carrierWatts: number): string => `${Number(carrierWatts.toPrecision(3))} W`;

/** How the rule comes to its figure, as a sum. */
export function ruleWords({ rule, attenuationDb }: SpuriousLimit, carrierWatts: number): string {
  const gives = `${fixed(attenuationDb)} dB`;
  const power = watts(carrierWatts);
  switch (rule) {
    case 'ITU below 30 MHz':
      return `43 + 10 log ${power} gives ${gives}; it never asks more than 50.`;
    case 'ITU above 30 MHz':
      return `43 + 10 log ${power} gives ${gives}; it never asks more than 70.`;
    case 'US below 30 MHz':
      return `${gives} at any power.`;
    case 'US below 30 MHz, before 2003':
      return `At most 50 mW, and ${carrierWatts < 5 ? '30 dB or more under 5 W' : '40 dB or more'}: ${gives} for ${power}.`;
    case 'US 30 to 225 MHz':
      return carrierWatts > 25
        ? `60 dB over 25 W: ${gives} for ${power}.`
        : `At most 25 µW and 40 dB or more, but never under 10 µW: ${gives} for ${power}.`;
  }
}

/** What is amiss between a rule and the carrier it is asked about, in words. */
export function misfitWords({ rule }: SpuriousLimit, { highHertz }: Carrier): string | undefined {
  const isRuleBelow = rule.includes('below 30 MHz');
  if (isRuleBelow === highHertz < 30e6) return undefined;
  return `This rule is for a carrier ${isRuleBelow ? 'below' : 'above'} 30 MHz; yours is not.`;
}
