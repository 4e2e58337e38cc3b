import { requireOneOf, requireWithin } from '../domain';
import type { ExposureLimits, ExposureTier } from '../rule-sets/exposure-limits';
import { hertz } from '../units';

const SPEED_OF_LIGHT = 299_792_458;
const TIERS = ['controlled', 'uncontrolled'] as const;

/**
 * Part of the time a station transmits, in the worst averaging window there can be.
 *
 * @param onMinutes - each transmission; above 0.
 * @param offMinutes - between two; 0 or more.
 * @param averagingMinutes - 6 for controlled, 30 for uncontrolled surroundings in the United States.
 * @returns 0 to 1.
 * @throws OutOfDomainError naming the input.
 * @example onFraction(2, 2, 6) //=> 0.666667
 * @example onFraction(7, 7, 30) //=> 0.533333
 * @see OET Bulletin 65, Supplement B (1997), worked examples
 */
export function onFraction(onMinutes: number, offMinutes: number, averagingMinutes: number): number {
  const minutes = { unit: 'min', atMost: 1e5 };
  requireWithin({ ...minutes, input: 'onMinutes', label: 'Transmitting', above: 0 }, onMinutes);
  requireWithin({ ...minutes, input: 'offMinutes', label: 'Listening', atLeast: 0 }, offMinutes);
  requireWithin(
    { ...minutes, input: 'averagingMinutes', label: 'Averaging time', above: 0 },
    averagingMinutes,
  );
  const cycle = onMinutes + offMinutes;
  const whole = Math.floor(averagingMinutes / cycle);
  return (whole * onMinutes + Math.min(onMinutes, averagingMinutes - whole * cycle)) / averagingMinutes;
}

/** A station, as far as exposure is concerned. */
export interface ExposureInput {
  frequencyHertz: number;
  peakWatts: number;
  /** Average over peak while transmitting: one of `MODE_DUTY`, or measured. */
  modeDuty: number;
  /** For each surroundings, because they average over different times: see `onFraction`. */
  onFraction: Readonly<Record<ExposureTier, number>>;
  feedLossDb: number;
  /** In the direction of people, against an antenna that radiates alike everywhere. */
  gainDbi: number;
  /** On the power: 1 free space, 2.56 ground that reflects 60 % of the field, 4 full reflection. */
  reflectionFactor: 1 | 2.56 | 4;
  limits: ExposureLimits;
}

/** Exposure in one kind of surroundings. */
export interface ExposureDistance {
  averageWatts: number;
  eirpWatts: number;
  limitMilliwattsPerSquareCentimetre: number;
  /** To the nearest part of the antenna: nearer, the limit may be passed. */
  metres: number;
  /** Nearer than this the formula for the far field does not hold: λ/2π. */
  nearFieldMetres: number;
  /** The distance lies in the near field: keep at least `nearFieldMetres`, or have the field measured. */
  isInNearField: boolean;
}

/**
 * Distance beyond which a station's average power density stays under the limit, for both kinds of surroundings.
 *
 * An estimate for the far field that errs towards caution in the near one. It says nothing of burns at the antenna, and
 * local rules may be stricter: check them.
 *
 * @throws OutOfDomainError naming the input; a frequency outside the limits' table too.
 * @example exposureDistances({ frequencyHertz: 28.5e6, peakWatts: 100, modeDuty: 1, onFraction: { controlled: 1, uncontrolled: 1 }, feedLossDb: 0, gainDbi: 2.15, reflectionFactor: 2.56, limits: US_EXPOSURE }).uncontrolled.metres //=> 3.883503
 * @see OET Bulletin 65 (1997), equations 3, 6 and 7: S = F·P·G/(4π·R²)
 */
export function exposureDistances(input: ExposureInput): Record<ExposureTier, ExposureDistance> {
  requireStation(input);
  return { controlled: distanceIn('controlled', input), uncontrolled: distanceIn('uncontrolled', input) };
}

function requireStation(input: ExposureInput): void {
  requireWithin(
    { input: 'peakWatts', label: 'Peak envelope power', unit: 'W', above: 0, atMost: 1e6 },
    input.peakWatts,
  );
  requireWithin({ input: 'modeDuty', label: 'Average over peak', above: 0, atMost: 1 }, input.modeDuty);
  const decibel = { unit: 'dB', atMost: 100 };
  requireWithin(
    { ...decibel, input: 'feedLossDb', label: 'Loss of the feeder', atLeast: 0 },
    input.feedLossDb,
  );
  requireWithin({ ...decibel, input: 'gainDbi', label: 'Gain of the antenna', atLeast: -100 }, input.gainDbi);
  requireOneOf({ input: 'reflectionFactor', label: 'Reflection' }, [1, 2.56, 4], input.reflectionFactor);
  for (const tier of TIERS) {
    const domain = { input: `onFraction.${tier}`, label: 'Part of the time', above: 0, atMost: 1 };
    requireWithin(domain, input.onFraction[tier]);
  }
}

function distanceIn(tier: ExposureTier, input: ExposureInput): ExposureDistance {
  const { peakWatts, modeDuty, feedLossDb, gainDbi, reflectionFactor, limits } = input;
  const averageWatts = peakWatts * modeDuty * input.onFraction[tier] * 10 ** (-feedLossDb / 10);
  const eirpWatts = averageWatts * 10 ** (gainDbi / 10);
  const limit = exposureLimit(limits, tier, input.frequencyHertz);
  // 1 mW/cm² is 10 W/m².
  const metres = Math.sqrt((reflectionFactor * eirpWatts) / (4 * Math.PI * 10 * limit));
  const nearFieldMetres = SPEED_OF_LIGHT / input.frequencyHertz / (2 * Math.PI);
  return {
    averageWatts,
    eirpWatts,
    limitMilliwattsPerSquareCentimetre: limit,
    metres,
    nearFieldMetres,
    isInNearField: metres < nearFieldMetres,
  };
}

/**
 * The limit at a frequency, as power density.
 *
 * @returns mW/cm².
 * @throws OutOfDomainError outside the table.
 * @example exposureLimit(US_EXPOSURE, 'uncontrolled', 14.2e6) //=> 0.89268
 * @see the limits' own source
 */
export function exposureLimit(limits: ExposureLimits, tier: ExposureTier, frequencyHertz: number): number {
  const rows = limits.rows[requireOneOf({ input: 'tier', label: 'Surroundings' }, TIERS, tier)];
  const [low, high] = [rows[0]?.fromMegahertz ?? 0, rows.at(-1)?.toMegahertz ?? 0];
  const megahertz = hertz(frequencyHertz, 'frequencyHertz') / 1e6;
  const domain = {
    input: 'frequencyHertz',
    label: 'Frequency',
    unit: 'Hz',
    atLeast: low * 1e6,
    atMost: high * 1e6,
  };
  requireWithin(domain, frequencyHertz);
  const row = rows.find(({ toMegahertz }) => megahertz < toMegahertz) ?? rows.at(-1);
  return (row?.factor ?? NaN) * megahertz ** (row?.power ?? 0);
}

/**
 * Average power density at a distance, by the same formula.
 *
 * @returns mW/cm².
 * @throws OutOfDomainError naming the input.
 * @example densityAt(exposureDistances({ frequencyHertz: 28.5e6, peakWatts: 100, modeDuty: 1, onFraction: { controlled: 1, uncontrolled: 1 }, feedLossDb: 0, gainDbi: 2.15, reflectionFactor: 2.56, limits: US_EXPOSURE }).controlled, 3) //=> 0.371354
 * @see as `exposureDistances`
 */
export function densityAt(
  { metres, limitMilliwattsPerSquareCentimetre }: ExposureDistance,
  distanceMetres: number,
): number {
  requireWithin(
    { input: 'distanceMetres', label: 'Distance', unit: 'm', above: 0, atMost: 1e7 },
    distanceMetres,
  );
  return limitMilliwattsPerSquareCentimetre * (metres / distanceMetres) ** 2;
}

/** Whether a source may go without an evaluation. */
export interface ExposureExemption {
  /** The rule may only be used at λ/2π or further. */
  isApplicable: boolean;
  /** Average ERP up to which it is exempt at that distance. */
  thresholdErpWatts: number;
  isExempt: boolean;
  nearFieldMetres: number;
}

/** MHz up to which a row holds, and its threshold in W for 1 m. */
const EXEMPTION_ROWS: readonly (readonly [number, (megahertz: number) => number])[] = [
  [1.34, () => 1920],
  [30, (megahertz) => 3450 / megahertz ** 2],
  [300, () => 3.83],
  [1500, (megahertz) => 0.0128 * megahertz],
  [100_000, () => 19.2],
];

/**
 * Whether a single source is exempt from an evaluation in the United States.
 *
 * @param distanceMetres - from people to the nearest part of the antenna.
 * @param averageErpWatts - averaged over time, against a half-wave dipole.
 * @throws OutOfDomainError naming the input.
 * @example exposureExemption(14.2e6, 10, 2000).isExempt //=> false
 * @see 47 CFR 1.1307(b)(3)(i)(C), Table 1, text of 2026-09-23
 */
export function exposureExemption(
  frequencyHertz: number,
  distanceMetres: number,
  averageErpWatts: number,
): ExposureExemption {
  const frequency = { input: 'frequencyHertz', label: 'Frequency', unit: 'Hz', atLeast: 0.3e6, atMost: 1e11 };
  const megahertz = requireWithin(frequency, frequencyHertz) / 1e6;
  requireWithin(
    { input: 'distanceMetres', label: 'Distance', unit: 'm', above: 0, atMost: 1e7 },
    distanceMetres,
  );
  requireWithin(
    { input: 'averageErpWatts', label: 'Average ERP', unit: 'W', atLeast: 0, atMost: 1e9 },
    averageErpWatts,
  );
  const [, atOneMetre] = EXEMPTION_ROWS.find(([top]) => megahertz < top) ??
    EXEMPTION_ROWS[4] ?? [0, () => NaN];
  const thresholdErpWatts = atOneMetre(megahertz) * distanceMetres ** 2;
  const nearFieldMetres = SPEED_OF_LIGHT / frequencyHertz / (2 * Math.PI);
  const isApplicable = distanceMetres >= nearFieldMetres;
  return {
    isApplicable,
    thresholdErpWatts,
    isExempt: isApplicable && averageErpWatts <= thresholdErpWatts,
    nearFieldMetres,
  };
}
