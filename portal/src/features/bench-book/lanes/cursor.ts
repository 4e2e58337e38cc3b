import type { Extent } from './extent';

/** Half hours of a day: what the arrow keys move by. */
export const SLOT_MINUTES = 30;

/** The half hours that are drawn: the first of them, and the one after the last. */
export const slotsOf = ({ from, to }: Extent): { first: number; end: number } => ({
  first: from / SLOT_MINUTES,
  end: to / SLOT_MINUTES,
});

/** The place in the lanes that the keyboard is at: `column` counts lanes through all days shown. */
export interface Cursor {
  column: number;
  slot: number;
  /** How many half hours are taken from `slot` on. */
  length: number;
}

const clamp = (value: number, least: number, most: number): number => Math.min(most, Math.max(least, value));

/**
 * Where a key leads; undefined when the key means nothing here.
 *
 * Arrows move by half an hour and lane by lane; with Shift, up and down stretch; Home and End go to the first and
 * the last lane, Page Up and Page Down by three hours.
 */
export function moved(
  cursor: Cursor,
  { key, isShift }: { key: string; isShift: boolean },
  columns: number,
  extent: Extent,
): Cursor | undefined {
  const { column, slot, length } = cursor;
  const { first, end } = slotsOf(extent);
  const to = (next: Partial<Cursor>): Cursor => ({
    column: clamp(next.column ?? column, 0, columns - 1),
    slot: clamp(next.slot ?? slot, first, end - 1),
    length: clamp(next.length ?? 1, 1, end - clamp(next.slot ?? slot, first, end - 1)),
  });
  if (isShift && key === 'ArrowDown') return to({ length: length + 1 });
  if (isShift && key === 'ArrowUp') return to({ length: length - 1 });
  switch (key) {
    case 'ArrowDown':
      return to({ slot: slot + 1 });
    case 'ArrowUp':
      return to({ slot: slot - 1 });
    case 'ArrowRight':
      return to({ column: column + 1 });
    case 'ArrowLeft':
      return to({ column: column - 1 });
    case 'Home':
      return to({ column: 0 });
    case 'End':
      return to({ column: columns - 1 });
    case 'PageDown':
      return to({ slot: slot + 6 });
    case 'PageUp':
      return to({ slot: slot - 6 });
    default:
      return undefined;
  }
}

/** The stretch of a lane from where a drag began to where it is, on quarter hours, at least one half hour. */
export function dragged(fromMinute: number, toMinute: number): { from: number; to: number } {
  const quarter = (minute: number, round: (value: number) => number) => round(minute / 15) * 15;
  const [low, high] = fromMinute <= toMinute ? [fromMinute, toMinute] : [toMinute, fromMinute];
  const from = quarter(low, Math.floor);
  return { from, to: clamp(Math.max(quarter(high, Math.ceil), from + SLOT_MINUTES), 0, 24 * 60) };
}
