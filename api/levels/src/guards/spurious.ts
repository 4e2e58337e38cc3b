import { requireOneOf, requireSome, requireWhole, requireWithin } from '../domain';
import { idealAttenuationDb } from '../filters/attenuation';
import { SPURIOUS_RULES } from '../rule-sets/spurious-rules';
import type { SpuriousRule, SpuriousRuleId } from '../rule-sets/spurious-rules';
import { dbmFromWatts } from '../conversions';
import { watts } from '../units';
import { verdictOf } from '../verdict';
import type { Verdict } from '../verdict';

/** How far below the carrier a spurious emission must lie. */
export interface SpuriousLimit {
  rule: SpuriousRuleId;
  attenuationDb: number;
  /** The most it may be. */
  greatestWatts: number;
  greatestDbm: number;
  power: SpuriousRule['power'];
  source: string;
}

/** Every rule offered. */
export const SPURIOUS_RULE_IDS = [
  'US below 30 MHz',
  'US below 30 MHz, before 2003',
  'US 30 to 225 MHz',
  'ITU below 30 MHz',
  'ITU above 30 MHz',
] as const;

/**
 * The limit of spurious emissions for a transmitter's power.
 *
 * @param carrierWatts - the power the rule counts by: see `power` in the result.
 * @throws OutOfDomainError naming the input.
 * @example spuriousLimit('ITU below 30 MHz', 5).attenuationDb //=> 49.9897
 * @example spuriousLimit('US below 30 MHz', 100).greatestWatts //=> 0.005012
 * @see the rule's own source, in the result
 */
export function spuriousLimit(rule: SpuriousRuleId, carrierWatts: number): SpuriousLimit {
  requireOneOf({ input: 'rule', label: 'Rule' }, SPURIOUS_RULE_IDS, rule);
  const domain = {
    input: 'carrierWatts',
    label: 'Power of the carrier',
    unit: 'W',
    atLeast: 1e-3,
    atMost: 1e6,
  };
  requireWithin(domain, carrierWatts);
  const { attenuationDb: attenuation, power, source } = SPURIOUS_RULES[rule];
  const attenuationDb = attenuation(carrierWatts);
  const greatestWatts = carrierWatts * 10 ** (-attenuationDb / 10);
  return {
    rule,
    attenuationDb,
    greatestWatts,
    greatestDbm: dbmFromWatts(watts(greatestWatts)),
    power,
    source,
  };
}

/** A spurious emission as measured. */
export interface MeasuredSpur {
  /** 2 for the second harmonic; any other emission where left out. */
  harmonic?: number;
  /** Against the carrier, negative when weaker. */
  dbc: number;
  /** k = 2; 0 where left out. */
  expandedUncertaintyDb?: number;
}

/** A spurious emission judged. */
export interface JudgedSpur extends MeasuredSpur {
  /** Limit less measured: negative is over the limit. */
  marginDb: number;
  verdict: Verdict;
  /** What a filter must still take, with the uncertainty on the safe side; 0 when nothing. */
  neededDb: number;
}

/**
 * Spurious emissions against a limit, and what the filter after the transmitter must take of each.
 *
 * @param spurs - 1 to 100.
 * @returns in the order given.
 * @throws OutOfDomainError naming the input.
 * @example judgeSpurs(spuriousLimit('ITU below 30 MHz', 5.0119), [{ harmonic: 2, dbc: -28 }])[0].neededDb //=> 22
 * @see `verdictOf`: the guard band is the expanded uncertainty
 */
export function judgeSpurs(
  limit: Pick<SpuriousLimit, 'attenuationDb'>,
  spurs: readonly MeasuredSpur[],
): JudgedSpur[] {
  requireSome({ input: 'spurs', label: 'Spurious emissions' }, spurs, 100);
  const high = -limit.attenuationDb;
  return spurs.map((spur) => {
    const { dbc, expandedUncertaintyDb = 0 } = spur;
    requireWithin(
      { input: 'dbc', label: 'Level against the carrier', unit: 'dBc', atLeast: -300, atMost: 100 },
      dbc,
    );
    const verdict = verdictOf(dbc, expandedUncertaintyDb, { high });
    return {
      ...spur,
      marginDb: high - dbc,
      verdict,
      neededDb: Math.max(dbc + expandedUncertaintyDb - high, 0),
    };
  });
}

/** A low-pass that would do. */
export interface HarmonicFilter {
  order: number;
  rippleDb: number;
  cutoffHertz: number;
  /** At each harmonic asked for, in that order, by the ideal response. */
  takenDb: number[];
}

/** What a harmonic filter is asked for. */
export interface HarmonicFilterInput {
  carrierHertz: number;
  /** Edge of its passband: at or over the carrier, under the lowest harmonic. */
  cutoffHertz: number;
  /** Chebyshev ripple, dB. */
  rippleDb: number;
  needs: readonly { harmonic: number; neededDb: number }[];
}

/**
 * The least Chebyshev low-pass, of 3, 5, 7 or 9 elements, whose ideal response takes what is needed.
 *
 * @returns undefined when none of them does: measure again, or filter better before the last stage.
 * @throws OutOfDomainError naming the input.
 * @example harmonicFilterFor({ carrierHertz: 14e6, cutoffHertz: 15.5e6, rippleDb: 0.0436, needs: [{ harmonic: 2, neededDb: 22 }] }).order //=> 5
 * @see `idealAttenuationDb`; real parts take a little more or less, which `harmonicRejections` works out
 */
export function harmonicFilterFor(input: HarmonicFilterInput): HarmonicFilter | undefined {
  const { carrierHertz, cutoffHertz, rippleDb, needs } = input;
  requireSome({ input: 'needs', label: 'Harmonics' }, needs, 20);
  for (const { harmonic, neededDb } of needs) {
    requireWhole({ input: 'harmonic', label: 'Harmonic', atLeast: 2, atMost: 100 }, harmonic);
    requireWithin({ input: 'neededDb', label: 'Needed', unit: 'dB', atLeast: 0, atMost: 200 }, neededDb);
  }
  const lowest = Math.min(...needs.map(({ harmonic }) => harmonic)) * carrierHertz;
  const carrier = { input: 'carrierHertz', label: 'Carrier', unit: 'Hz', above: 0, atMost: 1e12 };
  const edge = { input: 'cutoffHertz', label: 'Edge of the passband', unit: 'Hz' };
  requireWithin({ ...edge, atLeast: requireWithin(carrier, carrierHertz), below: lowest }, cutoffHertz);
  for (const order of [3, 5, 7, 9]) {
    const takenDb = needs.map(({ harmonic }) =>
      idealAttenuationDb({ family: 'Chebyshev', order, rippleDb }, (harmonic * carrierHertz) / cutoffHertz),
    );
    const isEnough = needs.every(({ neededDb }, index) => (takenDb[index] ?? 0) >= neededDb);
    if (isEnough) return { order, rippleDb, cutoffHertz, takenDb };
  }
  return undefined;
}
