import { requireOneOf, requireSome, requireWithin } from '../domain';
import { ohms } from '../units';

/** A coil or capacitor of a ladder, in the line or from it to ground. */
export interface LadderElement {
  name: string;
  place: 'series' | 'shunt';
  part: 'inductor' | 'capacitor';
  /** Henry or farad. */
  value: number;
}

/** Elements from the source to the load, and what they stand between. */
export interface Ladder {
  elements: LadderElement[];
  sourceOhms: number;
  loadOhms: number;
}

/** Most elements of a ladder: two for each of 15 orders, and the couplings. */
const GREATEST_ELEMENTS = 64;

/**
 * A ladder as given, when it can be worked with.
 *
 * @throws OutOfDomainError naming the input: no elements or too many, a value that is not above 0, an end without
 *   resistance.
 */
export function requireLadder(ladder: Ladder): Ladder {
  ohms(ladder.sourceOhms, 'sourceOhms');
  ohms(ladder.loadOhms, 'loadOhms');
  requireSome({ input: 'elements', label: 'Elements' }, ladder.elements, GREATEST_ELEMENTS);
  for (const { name, place, part, value } of ladder.elements) {
    requireOneOf({ input: 'place', label: `Place of ${name}` }, ['series', 'shunt'], place);
    requireOneOf({ input: 'part', label: `Kind of ${name}` }, ['inductor', 'capacitor'], part);
    const unit = part === 'inductor' ? 'H' : 'F';
    requireWithin({ input: name, label: `Value of ${name}`, unit, atLeast: 1e-18, atMost: 1e6 }, value);
  }
  return ladder;
}

/** Names parts as a schematic does: L1, C2, L3 by their place from the source. */
export function named(elements: readonly Omit<LadderElement, 'name'>[]): LadderElement[] {
  return elements.map((element, index) => {
    return { name: `${element.part === 'inductor' ? 'L' : 'C'}${index + 1}`, ...element };
  });
}
