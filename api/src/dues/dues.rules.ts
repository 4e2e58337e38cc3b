import { daysBetween } from '../common/club-day';
import { sumMinor } from '../common/minor-units';

export const INVOICE_STATES = ['open', 'part paid', 'late', 'paid'] as const;
export type InvoiceState = (typeof INVOICE_STATES)[number];

export interface Standing {
  amountMinor: number;
  paidMinor: number;
  dueOn: string;
}

/** What is left to pay. The database keeps it from going below nothing. */
export const openOf = ({ amountMinor, paidMinor }: Omit<Standing, 'dueOn'>): number =>
  amountMinor - paidMinor;

/** Days past the due day on `today`; 0 when it is paid or not yet past. */
export function daysLate(invoice: Standing, today: string): number {
  return openOf(invoice) === 0 ? 0 : Math.max(daysBetween(invoice.dueOn, today), 0);
}

export function stateOf(invoice: Standing, today: string): InvoiceState {
  if (openOf(invoice) === 0) return 'paid';
  if (daysLate(invoice, today) > 0) return 'late';
  return invoice.paidMinor > 0 ? 'part paid' : 'open';
}

export interface Share {
  invoiceId: string;
  amountMinor: number;
}

/**
 * Spreads an amount over open invoices in the order given, each to the full before the next.
 * @returns the shares that are more than nothing, and what is left over: credit on account.
 */
export function spread(
  amountMinor: number,
  invoices: readonly { id: string; openMinor: number }[],
): { shares: Share[]; leftMinor: number } {
  let leftMinor = amountMinor;
  const shares: Share[] = [];
  for (const { id, openMinor } of invoices) {
    const share = Math.min(leftMinor, openMinor);
    if (share <= 0) continue;
    shares.push({ invoiceId: id, amountMinor: share });
    leftMinor -= share;
  }
  return { shares, leftMinor };
}

export const AGES = ['not yet due', '1 to 30 days late', '31 to 60', '61 to 90', 'over 90'] as const;
export type Age = (typeof AGES)[number];

export function ageOf(late: number): Age {
  if (late === 0) return 'not yet due';
  if (late <= 30) return '1 to 30 days late';
  if (late <= 60) return '31 to 60';
  return late <= 90 ? '61 to 90' : 'over 90';
}

export interface AgeBand {
  age: Age;
  count: number;
  openMinor: number;
}

/** Open dues by age, every band named, an empty one too. */
export function aged(invoices: readonly Standing[], today: string): AgeBand[] {
  return AGES.map((age) => {
    const inBand = invoices.filter(
      (invoice) => openOf(invoice) > 0 && ageOf(daysLate(invoice, today)) === age,
    );
    return { age, count: inBand.length, openMinor: sumMinor(inBand.map(openOf)) };
  });
}

/** The letters a club's references begin with: `LRB` for Larkmoor Radio Builders. */
export function initialsOf(clubName: string): string {
  const words =
    clubName
      .normalize('NFD')
      .replaceAll(/\p{M}/gu, '')
      .toUpperCase()
      .match(/[A-Z0-9]+/g) ?? [];
  return words
    .map((word) => word.charAt(0))
    .join('')
    .slice(0, 6);
}
