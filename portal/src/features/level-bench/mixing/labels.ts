/** A name that wants a place beside its tick. */
export interface LabelWish {
  text: string;
  /** Of the tick. */
  x: number;
  y: number;
  /** Where it stands best. */
  side: Side;
  isStrong?: boolean;
}

type Side = 'above' | 'left' | 'right';

export interface PlacedLabel {
  text: string;
  x: number;
  y: number;
  anchor: 'start' | 'middle' | 'end';
  isStrong: boolean;
}

export interface LabelBox {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

/** Of 10.5 px semi-bold, on the wide side so that what nearly meets counts as meeting. */
const CHARACTER = 6.1;
const ABOVE = 7;
const BESIDE = 9;
const ASCENT = 9;
const DESCENT = 3;

export const labelWidth = (text: string): number => text.length * CHARACTER;

function placed({ text, x, y, isStrong = false }: LabelWish, side: Side): PlacedLabel {
  if (side === 'above') return { text, x, y: y - ABOVE, anchor: 'middle', isStrong };
  if (side === 'left') return { text, x: x - BESIDE, y: y + 4, anchor: 'end', isStrong };
  return { text, x: x + BESIDE, y: y + 4, anchor: 'start', isStrong };
}

/** Room a label takes. */
export function boxOf({ text, x, y, anchor }: PlacedLabel): LabelBox {
  const width = labelWidth(text);
  const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
  return { left, right: left + width, top: y - ASCENT, bottom: y + DESCENT };
}

const meet = (a: LabelBox, b: LabelBox): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

const lies = (inner: LabelBox, outer: LabelBox): boolean =>
  inner.left >= outer.left &&
  inner.right <= outer.right &&
  inner.top >= outer.top &&
  inner.bottom <= outer.bottom;

const SIDES: readonly Side[] = ['above', 'left', 'right'];

/**
 * Places names in their order: each on its best side, else on another that is free and inside; where none is, it is
 * joined to the first it meets.
 *
 * @param taken - room that no name may cover.
 */
export function placeLabels(
  wishes: readonly LabelWish[],
  room: LabelBox,
  taken: readonly LabelBox[] = [],
): PlacedLabel[] {
  const done: PlacedLabel[] = [];
  for (const wish of wishes) {
    const sides = [wish.side, ...SIDES.filter((side) => side !== wish.side)];
    const free = sides
      .map((side) => placed(wish, side))
      .find((label) => {
        const box = boxOf(label);
        return lies(box, room) && ![...taken, ...done.map(boxOf)].some((other) => meet(box, other));
      });
    if (free) done.push(free);
    else join(done, placed(wish, wish.side));
  }
  return done;
}

/** Two that meet become one label; where it only runs into something that is no name, it stands there all the same. */
function join(done: PlacedLabel[], label: PlacedLabel): void {
  const box = boxOf(label);
  const met = done.find((other) => meet(box, boxOf(other)));
  if (met) met.text = `${met.text}, ${label.text}`;
  else done.push(label);
}
