import { dateText } from '../../../lib/club-time-text';
import type { Instrument } from '../api/bench-book';

/** Why an instrument cannot be used by anybody on a day, or undefined when it can. Days gone by are left alone. */
export function hatchOf(instrument: Instrument | undefined, date: string, today: string): string | undefined {
  if (!instrument || date < today) return undefined;
  const { condition, calibrationDueOn, kind } = instrument;
  if (condition !== 'ready') return condition === 'in repair' ? 'In repair' : 'Out of use';
  if (!kind.needsCalibration) return undefined;
  if (calibrationDueOn === null) return 'No calibration on record';
  return calibrationDueOn < date ? `Calibration ended ${dateText(calibrationDueOn)}` : undefined;
}
