import { dateWords } from '../common/club-day';
import type { Condition } from './instrument.entity';

/** What decides whether somebody may use an instrument. */
export interface UseFacts {
  tag: string;
  kindName: string;
  needsClearance: boolean;
  needsCalibration: boolean;
  condition: Condition;
  conditionNote: string;
  calibrationDueOn: string | null;
  /** The person's clearance on the kind, if there is one. */
  clearance: { until: string | null } | undefined;
}

/** Days of the club, `2026-10-15`. */
export interface UseDays {
  today: string;
  /** Last day of the use. */
  lastDay: string;
}

export const REASON_CODES = [
  'in repair',
  'out of use',
  'calibration unknown',
  'calibration past',
  'not cleared',
  'clearance past',
] as const;

/** Why not, and what would help. */
export interface UseReason {
  code: (typeof REASON_CODES)[number];
  reason: string;
  remedy: string;
}

/** Every reason against the use, the gravest first; none means that it may be used. */
export function reasonsAgainst(facts: UseFacts, days: UseDays): UseReason[] {
  return [conditionReason(facts), calibrationReason(facts, days), clearanceReason(facts, days)].filter(
    (reason) => reason !== undefined,
  );
}

/** Last day on which the person may use it, as far as anybody knows today; undefined when no day ends it. */
export function usableUntil(facts: UseFacts): string | undefined {
  const ends = [
    facts.needsCalibration ? facts.calibrationDueOn : null,
    facts.needsClearance ? (facts.clearance?.until ?? null) : null,
  ];
  return ends.filter((day) => day !== null).sort()[0];
}

function conditionReason({ condition, conditionNote, tag, kindName }: UseFacts): UseReason | undefined {
  if (condition === 'ready') return undefined;
  const note = conditionNote ? `: ${sentence(conditionNote)}` : '.';
  return {
    code: condition,
    reason: `${tag} is ${condition}${note}`,
    remedy: `Choose another ${lower(kindName)}, or ask a steward when it is back.`,
  };
}

function calibrationReason(facts: UseFacts, { today, lastDay }: UseDays): UseReason | undefined {
  const { needsCalibration, calibrationDueOn: due, tag, kindName } = facts;
  if (!needsCalibration) return undefined;
  const other = `another ${lower(kindName)}`;
  if (due === null)
    return {
      code: 'calibration unknown',
      reason: `${tag} has no calibration on record.`,
      remedy: `Choose ${other}, or ask a steward to enter its calibration.`,
    };
  if (due >= lastDay) return undefined;
  if (due >= today)
    return {
      code: 'calibration past',
      reason: `The calibration of ${tag} holds until ${dateWords(due)}.`,
      remedy: `Choose a day up to ${dateWords(due)}, or ${other}.`,
    };
  return {
    code: 'calibration past',
    reason: `The calibration of ${tag} ran out on ${dateWords(due)}.`,
    remedy: `Choose ${other}, or ask a steward when it goes for calibration.`,
  };
}

function clearanceReason(facts: UseFacts, { today, lastDay }: UseDays): UseReason | undefined {
  const { needsClearance, clearance, kindName } = facts;
  if (!needsClearance) return undefined;
  const kind = lower(kindName);
  if (!clearance)
    return {
      code: 'not cleared',
      reason: `Clearance needed: you are not cleared on the ${kind}.`,
      remedy: 'Ask a steward to clear you on it.',
    };
  const { until } = clearance;
  if (until === null || until >= lastDay) return undefined;
  const ends = until >= today;
  return {
    code: 'clearance past',
    reason: `Your clearance on the ${kind} ${ends ? 'ends' : 'ended'} on ${dateWords(until)}.`,
    remedy: `${ends ? `Choose a day up to ${dateWords(until)}, or ask` : 'Ask'} a steward to renew it.`,
  };
}

/** A kind's name inside a sentence: `spectrum analyzer`, but `RF millivoltmeter` keeps its capitals. */
export function lower(name: string): string {
  return /^.[A-Z]/.test(name) ? name : name.charAt(0).toLowerCase() + name.slice(1);
}

function sentence(note: string): string {
  return /[.!?]$/.test(note) ? note : `${note}.`;
}
