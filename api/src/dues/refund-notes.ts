import type Stripe from 'stripe';
import { writeMinor } from '../common/minor-units';

/** The charge an event that takes card money back is about, where the event is one. */
export interface TakenBackByCard {
  chargeId: string;
  metadata: Record<string, string>;
  /** What the treasurer should know, given what the money had paid: 'R-0298 from Tamsin Ardley'. */
  note: (paid: string) => string;
}

const BOOKS = 'The books do not show it.';
const money = (amountMinor: number, currency: string): string => {
  const code = currency.toUpperCase();
  return `${writeMinor(amountMinor, code)} ${code}`;
};
const idOf = (linked: string | { id: string } | null): string =>
  typeof linked === 'string' ? linked : (linked?.id ?? 'unknown');

/** Reads refunds and disputes; anything else is undefined. */
export function takenBackByCard(event: Stripe.Event): TakenBackByCard | undefined {
  if (event.type === 'charge.refunded') return refunded(event.data.object);
  if (event.type === 'refund.failed') return refundFailed(event.data.object);
  if (event.type === 'charge.dispute.created' || event.type === 'charge.dispute.closed')
    return disputed(event.data.object);
  return undefined;
}

function refunded({ id, metadata, amount, amount_refunded, currency }: Stripe.Charge): TakenBackByCard {
  const back = money(amount_refunded, currency);
  const share = amount_refunded < amount ? `${back} of ${money(amount, currency)}` : back;
  return { chargeId: id, metadata, note: (paid) => `${share} went back to the card for ${paid}. ${BOOKS}` };
}

function refundFailed({ charge, amount, currency }: Stripe.Refund): TakenBackByCard {
  const note = (paid: string): string =>
    `A refund of ${money(amount, currency)} for ${paid} did not reach the card.`;
  return { chargeId: idOf(charge), metadata: {}, note };
}

const DISPUTE_ENDS: Partial<Record<Stripe.Dispute.Status, string>> = {
  won: 'It was decided for the club: the money stays.',
  lost: `It was decided against the club: the money went back. ${BOOKS}`,
};

function disputed({ charge, amount, currency, status }: Stripe.Dispute): TakenBackByCard {
  const end = DISPUTE_ENDS[status] ?? 'Answer it at the card service, which may take the money back.';
  const note = (paid: string): string =>
    `The cardholder disputes ${money(amount, currency)} for ${paid}. ${end}`;
  return { chargeId: idOf(charge), metadata: {}, note };
}
