import { addDays } from '../../lib/club-time';
import { dayText, longDayText } from '../../lib/club-time-text';
import type { Invoice } from './api/dues';

/** What falls due within four weeks is owed now; what comes later is coming up. */
const SOON_DAYS = 28;

export interface Standing {
  /** Late ones first, then by due day. */
  owed: Invoice[];
  comingUp: Invoice[];
  owedMinor: number;
  lateMinor: number;
}

export function standingOf(invoices: readonly Invoice[], today: string): Standing {
  const open = invoices
    .filter(({ openMinor }) => openMinor > 0)
    .toSorted((a, b) => compare(a.dueOn, b.dueOn));
  const until = addDays(today, SOON_DAYS);
  const owed = open.filter(({ dueOn }) => dueOn <= until);
  return {
    owed,
    comingUp: open.filter(({ dueOn }) => dueOn > until),
    owedMinor: sum(owed),
    lateMinor: sum(owed.filter(({ daysLate }) => daysLate > 0)),
  };
}

const compare = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
const sum = (invoices: readonly Invoice[]): number =>
  invoices.reduce((total, { openMinor }) => total + openMinor, 0);

/** '23 days past due'. */
export const lateText = (days: number): string => `${days} ${days === 1 ? 'day' : 'days'} past due`;

/** 'Due Sat 31 Oct.' or 'Was due Sat 31 Oct.' */
export function dueText({ dueOn, daysLate }: Pick<Invoice, 'dueOn' | 'daysLate'>): string {
  return daysLate > 0 ? `Was due ${dayText(dueOn)}.` : `Due ${dayText(dueOn)}.`;
}

/** 'Nothing owed until Saturday 31 October'. */
export function nothingOwedText({ comingUp: [next] }: Standing): string {
  return next ? `Nothing owed until ${longDayText(next.dueOn)}` : 'Nothing owed';
}
