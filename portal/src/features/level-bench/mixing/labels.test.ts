import { describe, expect, it } from 'vitest';
import { boxOf, placeLabels, type LabelBox, type LabelWish } from './labels';

const ROOM: LabelBox = { left: 0, right: 400, top: 0, bottom: 200 };
const wish = (text: string, x: number, y: number, side: LabelWish['side'] = 'above'): LabelWish => ({
  text,
  x,
  y,
  side,
});

const overlap = (a: LabelBox, b: LabelBox): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

describe('names beside their ticks', () => {
  it('stand on their best side where it is free', () => {
    const [above, left] = placeLabels([wish('LO', 100, 100), wish('2·IF', 300, 100, 'left')], ROOM);
    expect(above).toMatchObject({ anchor: 'middle', x: 100 });
    expect(left).toMatchObject({ anchor: 'end' });
    expect(left.x).toBeLessThan(300);
  });

  it('move aside for one that was there first', () => {
    const labels = placeLabels([wish('LO + IF', 100, 100), wish('3·IF', 120, 100)], ROOM);
    expect(labels).toHaveLength(2);
    expect(overlap(boxOf(labels[0]), boxOf(labels[1]))).toBe(false);
  });

  it('become one where there is no free side', () => {
    const labels = placeLabels(
      [wish('A', 100, 100), wish('BB', 100, 100), wish('CC', 100, 100), wish('DD', 100, 100)],
      ROOM,
    );
    expect(labels.map(({ text }) => text)).toEqual(['A, DD', 'BB', 'CC']);
  });

  it('stay inside the picture', () => {
    const [label] = placeLabels([wish('2·LO − 3·IF', 396, 100)], ROOM);
    expect(boxOf(label).right).toBeLessThanOrEqual(ROOM.right);
  });

  it('keep off what may not be covered', () => {
    const goal = { left: 60, right: 200, top: 80, bottom: 94 };
    const [label] = placeLabels([wish('LO', 100, 100)], ROOM, [goal]);
    expect(overlap(boxOf(label), goal)).toBe(false);
  });
});
