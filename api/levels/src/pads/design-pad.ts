import { requireWithin } from '../domain';
import { fittedPart } from './fitted-part';
import type { FitChoice, FittedPart } from './fitted-part';
import { padPerformance } from './pad-performance';
import type { PadPerformance } from './pad-performance';
import { padValues } from './pad-values';
import type { PadInput, PadResistor } from './pad-values';
import { ratingToBuy } from './rating';
import type { ResistorRating } from './rating';
import { padWorstCase } from './worst-case';
import type { PadWorstCase } from './worst-case';

/** A pad to be built. */
export interface DesignPadInput extends PadInput, FitChoice {
  /** Of every resistor, 0.05 for 5 %. */
  toleranceRel: number;
  /** Average power available from the source. */
  inputWatts: number;
}

/** One resistor of a pad to be built. */
export interface DesignedResistor extends PadResistor {
  /** `ohms` is what the fitted parts make. */
  exactOhms: number;
  fitted: FittedPart;
  /** Average power in all its parts together. */
  watts: number;
  /** For each part, in the order of `fitted.parts`. */
  ratings: ResistorRating[];
}

/** A pad with what it is, what it does and what to buy. */
export interface PadDesign {
  kind: PadInput['kind'];
  resistors: DesignedResistor[];
  exact: PadPerformance;
  fitted: PadPerformance;
  worst: PadWorstCase;
}

/**
 * A pad from preferred values: what to fit, what it really gives, and how hot it gets.
 *
 * @returns figures of the fitted parts, not of the exact ones, wherever it is not called `exact`.
 * @throws OutOfDomainError naming the input.
 * @example designPad({ kind: 'pi', lossDb: 3, sourceOhms: 50, loadOhms: 50, series: 'E24', toleranceRel: 0.05, inputWatts: 0.01 }).resistors.map(({ ohms }) => ohms) //=> [300, 18, 300]
 * @example designPad({ kind: 'pi', lossDb: 3, sourceOhms: 50, loadOhms: 50, series: 'E24', toleranceRel: 0.05, inputWatts: 0.01 }).fitted.lossDb //=> 2.994643
 * @see `padValues`, `padPerformance`, `fittedPart`, `ratingToBuy`
 */
export function designPad(input: DesignPadInput): PadDesign {
  const { kind, inputWatts, toleranceRel } = input;
  requireWithin({ input: 'inputWatts', label: 'Power in', unit: 'W', atLeast: 0, atMost: 1e6 }, inputWatts);
  const exact = padValues(input);
  const chosen = exact.map((resistor) => {
    const part = fittedPart(resistor.ohms, 'resistance', input);
    return { ...resistor, ohms: part.value, exactOhms: resistor.ohms, fitted: part };
  });
  const fitted = padPerformance(chosen, input);
  const resistors = chosen.map((resistor, index) => {
    const watts = (fitted.dissipationShares[index] ?? 0) * inputWatts;
    return { ...resistor, watts, ratings: ratingsOf(resistor.fitted, watts) };
  });
  const worst = padWorstCase(chosen, input, toleranceRel);
  return { kind, resistors, exact: padPerformance(exact, input), fitted, worst };
}

/** Two in series share one current, two in parallel one voltage. */
function ratingsOf({ parts, arrangement, value }: FittedPart, watts: number): ResistorRating[] {
  return parts.map((part) => ratingToBuy(watts * (arrangement === 'parallel' ? value / part : part / value)));
}
