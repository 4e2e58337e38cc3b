import { turnsFor } from '../matching/turns';
import type { Turns } from '../matching/turns';
import { fittedPart } from '../pads/fitted-part';
import type { FitChoice, FittedPart } from '../pads/fitted-part';
import { requireLadder } from './ladder';
import type { Ladder, LadderElement } from './ladder';

/** How the parts of a ladder may be made up. */
export interface FitLadderInput {
  capacitors: FitChoice;
  /** Whole turns on a core of this A_L, nH per turn squared; or coils from a series of preferred values. */
  inductors: { alNanohenry: number } | FitChoice;
}

/** An element with the parts that make it. */
export interface FittedElement extends LadderElement {
  exactValue: number;
  errorRel: number;
  /** One of the two. */
  fitted?: FittedPart;
  turns?: Turns;
}

/** A ladder of real parts. */
export interface FittedLadder extends Ladder {
  elements: FittedElement[];
}

/**
 * The nearest ladder that can be built: capacitors of preferred values, coils of whole turns or preferred values.
 *
 * @returns a ladder again, whose `value`s are those of the fitted parts: hand it to `ladderResponse`.
 * @throws OutOfDomainError naming the input.
 * @example fitLadder(lowPassLadder({ family: 'Butterworth', order: 3, cutoffHertz: 10e6, sourceOhms: 50, first: 'series' }), { capacitors: { series: 'E12' }, inductors: { alNanohenry: 4.2 } }).elements.map(({ name, turns, fitted }) => [name, turns?.turns ?? fitted.parts[0] * 1e12]) //=> [['L1', 14], ['C2', 680], ['L3', 14]]
 * @see `fittedPart`, `turnsFor`
 */
export function fitLadder(ladder: Ladder, { capacitors, inductors }: FitLadderInput): FittedLadder {
  const elements = requireLadder(ladder).elements.map((element): FittedElement => {
    if (element.part === 'capacitor')
      return madeUp(element, fittedPart(element.value, 'capacitance', capacitors));
    if (!('alNanohenry' in inductors))
      return madeUp(element, fittedPart(element.value, 'inductance', inductors));
    const turns = turnsFor(element.value, inductors.alNanohenry);
    return { ...element, value: turns.henries, exactValue: element.value, errorRel: turns.errorRel, turns };
  });
  return { ...ladder, elements };
}

function madeUp(element: LadderElement, fitted: FittedPart): FittedElement {
  return { ...element, value: fitted.value, exactValue: element.value, errorRel: fitted.errorRel, fitted };
}
