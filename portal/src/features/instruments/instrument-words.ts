import { daysBetween } from '../../lib/club-time';
import { dateText } from '../../lib/club-time-text';
import type { InstrumentState } from '../../shared-ui/states/state-words';
import type { Change, Instrument } from './api/instruments';

/** From here on a calibration is said to be due. */
const SOON_DAYS = 30;

export interface StateWords {
  state: InstrumentState;
  words: string;
}

/** An instrument's state for the person who looks: the gravest thing first. */
export function stateOf(instrument: Instrument, today: string): StateWords {
  const { condition, conditionNote, reasons } = instrument;
  if (condition !== 'ready')
    return { state: 'out of use', words: condition === 'in repair' ? 'In repair' : 'Out of use' };
  const due = calibrationState(instrument, today);
  if (due?.isPast) return { state: 'calibration due', words: due.words };
  if (reasons.some(({ code }) => code === 'not cleared' || code === 'clearance past'))
    return { state: 'clearance needed', words: 'Clearance needed' };
  if (due?.isSoon) return { state: 'calibration due', words: due.words };
  return conditionNote ? { state: 'with care', words: 'With care' } : { state: 'ready', words: 'Ready' };
}

export interface Due {
  /** Days left; negative when past. */
  days: number;
  isPast: boolean;
  isSoon: boolean;
  words: string;
}

/** How its calibration stands; undefined for a kind that needs none. */
export function calibrationState({ kind, calibrationDueOn }: Instrument, today: string): Due | undefined {
  if (!kind.needsCalibration) return undefined;
  if (calibrationDueOn === null)
    return { days: -Infinity, isPast: true, isSoon: false, words: 'No calibration on record' };
  const days = daysBetween(today, calibrationDueOn);
  if (days < 0) return { days, isPast: true, isSoon: false, words: 'Calibration past' };
  const when = days === 0 ? 'today' : days === 1 ? 'tomorrow' : `in ${days} days`;
  return { days, isPast: false, isSoon: days <= SOON_DAYS, words: `Calibration due ${when}` };
}

export function clearanceWords({ kind, myClearance, reasons }: Instrument): string {
  if (!kind.needsClearance) return 'None needed';
  const against = reasons.find(({ code }) => code === 'not cleared' || code === 'clearance past');
  if (against) return 'You are not cleared';
  return myClearance?.until ? `Cleared until ${dateText(myClearance.until)}` : 'You are cleared';
}

export const calibrationWords = ({ kind, calibrationDueOn }: Instrument): string =>
  !kind.needsCalibration
    ? 'None needed'
    : calibrationDueOn
      ? `Due ${dateText(calibrationDueOn)}`
      : 'None on record';

/** One line of the history: what was changed from what to what. */
export function changeWords({ changed, before, after }: Change): string {
  if (changed === 'condition')
    return after === 'ready' ? 'Ready again' : after === 'in repair' ? 'In repair' : 'Out of use';
  const day = (text: string | null) => (text ? dateText(text) : 'none');
  return `Calibration good until ${day(after)}, before ${day(before)}`;
}
