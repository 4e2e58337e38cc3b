import type { EntityManager, FindOptionsWhere } from 'typeorm';
import { CheckMark } from './check-mark.entity';

/**
 * Takes marks back, at the earliest when they were made: the server that made them may have had a clock ahead of this
 * one's.
 */
export async function takeMarksBack(
  manager: EntityManager,
  standing: FindOptionsWhere<CheckMark>,
  now: Date,
): Promise<void> {
  await manager
    .createQueryBuilder()
    .update(CheckMark)
    .set({ takenBackAt: () => 'greatest(at, :now::timestamptz)' })
    .where(standing)
    .setParameter('now', now)
    .execute();
}
