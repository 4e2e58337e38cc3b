import { labelWidth, placeLabels, type LabelBox, type LabelWish, type PlacedLabel } from './labels';
import type { ProductRow } from './rows';
import { bottomOf, type Scale } from './scale';

/** A product where it is drawn. */
export interface ProductMark {
  row: ProductRow;
  x: number;
  /** Of the tick, leaving the mixer. */
  yTick: number;
  /** Of the end mark, after the filter. */
  yEnd: number;
  /** After the filter it is under the foot of the plot. */
  isOff: boolean;
}

/** What there is to draw: on the axis, and leaving the mixer above its foot. */
export function marksOf(rows: readonly ProductRow[], scale: Scale): ProductMark[] {
  const foot = bottomOf(scale);
  return rows
    .filter(({ product }) => product.hertz <= scale.maxHertz && product.levelDbm > foot)
    .map((row) => ({
      row,
      x: scale.x(row.product.hertz),
      yTick: scale.y(row.product.levelDbm),
      yEnd: scale.y(row.product.filteredDbm),
      isOff: row.product.filteredDbm < foot,
    }));
}

/** Ticks this far down have their name beside them: above, it would stand among the stems of the stronger. */
const LOW = 0.7;

const PHONE_NAMES = 4;

function wishOf({ row, x, yTick, yEnd }: ProductMark, { top, bottom, isPhone }: Scale): LabelWish {
  const { product, note } = row;
  if (product.isWanted) {
    const text = isPhone ? 'wanted' : `${product.name}, wanted`;
    return { text, x: x - 4, y: yEnd, side: 'left', isStrong: true };
  }
  const isLow = yTick > top + LOW * (bottom - top);
  const text = note === 'leakage' && !isPhone ? `${product.name} leakage` : product.name;
  return { text, x, y: yTick, side: isLow ? 'left' : 'above' };
}

/** Names of the products in the table, on a phone of the first few. */
export function namesOf(
  marks: readonly ProductMark[],
  scale: Scale,
  taken: readonly LabelBox[],
): PlacedLabel[] {
  const named = scale.isPhone ? marks.slice(0, PHONE_NAMES) : marks;
  const room = { left: scale.left, right: scale.right, top: scale.top - 16, bottom: scale.bottom };
  return placeLabels(
    named.map((mark) => wishOf(mark, scale)),
    room,
    [...taken, ...named.filter(({ row }) => row.product.isWanted).map(ringBox)],
  );
}

const RING = 7;
const ringBox = ({ x, yEnd }: ProductMark): LabelBox => ({
  left: x - RING,
  right: x + RING,
  top: yEnd - RING,
  bottom: yEnd + RING,
});

/** The goal's own words at the right end of its line. */
export function goalLabel(text: string, { right }: Scale, y: number): PlacedLabel & { box: LabelBox } {
  const x = right - 4;
  return {
    ...{ text, x, y: y - 6, anchor: 'end', isStrong: false },
    box: { left: x - labelWidth(text), right: x, top: y - 16, bottom: y - 2 },
  };
}

export type Step = 'left' | 'right' | 'up' | 'down' | 'first' | 'last';

/**
 * The product a key leads to: sideways by frequency, up and down in the order of the table.
 *
 * @param marks - in the order of the table.
 */
export function stepFrom(
  marks: readonly ProductMark[],
  from: string | undefined,
  step: Step,
): string | undefined {
  const isSideways = step !== 'up' && step !== 'down';
  const line = isSideways ? [...marks].sort((a, b) => a.row.product.hertz - b.row.product.hertz) : marks;
  const at = line.findIndex(({ row }) => row.product.name === from);
  const last = line.length - 1;
  const to = { first: 0, last, left: at < 0 ? last : at - 1, right: at + 1, up: at - 1, down: at + 1 }[step];
  return line[Math.min(Math.max(to, 0), last)]?.row.product.name;
}

/** How far from a mark a press still means it, px. */
const REACH = 12;

/** The product under a press: the nearest stem, of two the nearer tick. */
export function nearestMark(marks: readonly ProductMark[], x: number, y: number): ProductMark | undefined {
  const awayOf = (mark: ProductMark) => {
    const [top, bottom] = [Math.min(mark.yTick, mark.yEnd), Math.max(mark.yTick, mark.yEnd)];
    return Math.hypot(mark.x - x, Math.max(top - y, y - bottom, 0));
  };
  const near = marks.filter((mark) => awayOf(mark) <= REACH);
  return near.sort((a, b) => awayOf(a) - awayOf(b) || Math.abs(a.yTick - y) - Math.abs(b.yTick - y))[0];
}
