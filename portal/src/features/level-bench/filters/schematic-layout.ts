import type { FittedElement, FittedLadder } from '@ferrite-row/levels';

/** Where an element stands: its middle on the line, or the node its leg hangs from. */
interface PlacedElement {
  element: FittedElement;
  x: number;
}

export interface SchematicLayout {
  width: number;
  /** Ends of the line: the source's terminal and the load's. */
  from: number;
  to: number;
  placed: PlacedElement[];
}

/** Room for a terminal and its words. */
const END = 34;
/** The least an element needs for its value beside it. */
const LEAST_SLOT = 74;
/** Before the first element, and after the last, whose words stand to its right; in slots. */
const BEFORE = 0.7;
const AFTER = 1.2;

/** Elements from source to load at equal steps; narrower than their words need, the drawing grows past its frame. */
export function layOut({ elements }: Pick<FittedLadder, 'elements'>, frameWidth: number): SchematicLayout {
  const slots = BEFORE + elements.length - 1 + AFTER;
  const width = Math.max(frameWidth, 2 * END + LEAST_SLOT * slots);
  const slot = (width - 2 * END) / slots;
  return {
    width,
    from: END,
    to: width - END,
    placed: elements.map((element, index) => ({ element, x: END + (BEFORE + index) * slot })),
  };
}
