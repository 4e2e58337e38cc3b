import type { PlanCheck } from '@ferrite-row/api/plans/plan-check.entity';
import type { Dice } from '../dice';

type Window = Pick<PlanCheck, 'windowLow' | 'windowHigh' | 'target'>;

/** How far from the target a careful builder comes out, as a share of half the window. */
const SPREAD = 0.22;

/**
 * A value a careful builder would find: near the target, or well inside an open window.
 *
 * @param care - 1 for the first try; smaller comes nearer, for a retake; above 1 nothing is trimmed yet.
 */
export function plausible({ windowLow, windowHigh, target }: Window, dice: Dice, care: number): number {
  if (windowLow !== null && windowHigh !== null) {
    const middle = target ?? (windowLow + windowHigh) / 2;
    return middle + dice.bell() * SPREAD * care * ((windowHigh - windowLow) / 2);
  }
  if (windowHigh !== null) return windowHigh - (roomOf(windowHigh) * (1.2 + dice.next())) / Math.max(1, care);
  if (windowLow !== null) return windowLow + (roomOf(windowLow) * (1.2 + dice.next())) / Math.max(1, care);
  return target ?? 0;
}

/** In an open window the room taken is about a sixth of the limit itself. */
const roomOf = (limit: number): number => Math.max(Math.abs(limit) / 6, 0.01);

/**
 * How far the next level of the signal path lies from its plan, dB: a stage with the planned gain hands on the
 * difference it was fed with, less what its builder trimmed away, and adds a little of its own.
 */
export function nextOffset(offsetDb: number, dice: Dice, care: number): number {
  return care * (0.7 * offsetDb + 0.14 * dice.bell());
}
